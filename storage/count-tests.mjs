/**
 * @typedef {{ passed: number, failed: number, skipped: number }} Counts
 * @typedef {{ status: string, assertionResults: { status: string }[] }} FileResult
 */

/**
 * Counts vitest's JSON report. A file that could not even be loaded counts as one failure, since none of its tests ran.
 * @param {{ testResults: FileResult[], success?: boolean }} report
 * @returns {Counts}
 */
export function countReport({ testResults, success = true }) {
  const counts = { passed: 0, failed: 0, skipped: 0 };
  for (const { status, assertionResults } of testResults) {
    for (const test of assertionResults) counts[placeOf(test.status)] += 1;
    const noneFailed = assertionResults.every((test) => placeOf(test.status) !== "failed");
    if (status === "failed" && noneFailed) counts.failed += 1;
  }
  // Vitest can fail outside any test: an unhandled rejection, or a set-up that throws.
  if (!success && counts.failed === 0) counts.failed = 1;
  return counts;
}

/** @param {string} status @returns {keyof Counts} */
function placeOf(status) {
  if (status === "passed") return "passed";
  return status === "failed" ? "failed" : "skipped";
}

/** @param {...Counts} all @returns {Counts} */
export function sum(...all) {
  return all.reduce(
    (total, one) => ({
      passed: total.passed + one.passed,
      failed: total.failed + one.failed,
      skipped: total.skipped + one.skipped,
    }),
    { passed: 0, failed: 0, skipped: 0 },
  );
}

/** @param {Counts} counts */
export const countsLine = ({ passed, failed, skipped }) => `${passed} passed, ${failed} failed, ${skipped} skipped`;
