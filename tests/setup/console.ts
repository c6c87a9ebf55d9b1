import { afterEach, beforeEach, expect, vi } from "vitest";

// An unexpected console.error or console.warn fails the test that caused it.
// A test that expects one replaces the spy: vi.spyOn(console, "error").mockImplementation(() => {}).
const calls: unknown[][] = [];

beforeEach(() => {
  calls.length = 0;
  vi.spyOn(console, "error").mockImplementation((...args) => void calls.push(args));
});

afterEach(() => {
  const seen = [...calls];
  vi.restoreAllMocks();
  expect(seen, "unexpected console.error").toEqual([]);
});
