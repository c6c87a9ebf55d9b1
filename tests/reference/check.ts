import { expect } from "vitest";

/**
 * Checks every case and counts them: fails when fewer than 200 are there, or when a check throws, naming the case.
 */
export function checkAll<Case>(cases: Case[], check: (one: Case) => void): void {
  expect(cases.length).toBeGreaterThanOrEqual(200);
  let checked = 0;
  for (const one of cases) {
    try {
      check(one);
    } catch (cause) {
      throw new Error(`${JSON.stringify(one)}\n${cause instanceof Error ? cause.message : cause}`, { cause });
    }
    checked++;
  }
  expect(checked).toBe(cases.length);
}

/** Within a share of the expected value, or of `floor` where the value is smaller than that. */
export function expectClose(actual: number, expected: number, tolerance: number, floor = 0): void {
  if (actual === expected) return;
  const allowed = tolerance * Math.max(Math.abs(expected), floor);
  const off = Math.abs(actual - expected);
  expect(off <= allowed, `${actual} is ${off} from ${expected}, allowed ${allowed}`).toBe(true);
}
