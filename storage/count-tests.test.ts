import { expect, test } from "vitest";
import { countReport, countsLine, sum } from "./count-tests.mjs";

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((one) => ({ status: one })),
});

test("tests are counted by how they ended; what was not run is skipped", () => {
  const testResults = [file("passed", "passed", "passed", "skipped"), file("failed", "failed", "pending", "todo")];
  expect(countReport({ testResults, success: false })).toEqual({ passed: 2, failed: 1, skipped: 3 });
});

test("a file that could not be loaded is a failure", () => {
  expect(countReport({ testResults: [file("failed")], success: false })).toEqual({ passed: 0, failed: 1, skipped: 0 });
});

test("a failure outside every test is a failure", () => {
  expect(countReport({ testResults: [file("passed", "passed")], success: false }).failed).toBe(1);
});

test("the line of the counts", () => {
  const one = { passed: 1, failed: 2, skipped: 3 };
  expect(countsLine(sum(one, one))).toBe("2 passed, 4 failed, 6 skipped");
});
