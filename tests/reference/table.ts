import { readFileSync } from "node:fs";
import { expect } from "vitest";

export interface Table<Case> {
  script: string;
  versions: Record<string, string>;
  cases: Case[];
}

/** JSON has no number for an infinity; the scripts write the word. */
const infinities = (_: string, value: unknown) =>
  value === "Infinity" || value === "-Infinity" ? Number(value) : value;

/** A table as a script printed it. */
export function parseTable<Case>(text: string): Table<Case> {
  return JSON.parse(text, infinities);
}

/** A committed table, by the name of its script. */
export function readTable<Case>(name: string): Table<Case> {
  return parseTable(readFileSync(new URL(`./tables/${name}.json`, import.meta.url), "utf8"));
}

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
