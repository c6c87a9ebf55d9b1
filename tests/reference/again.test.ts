import { execFile } from "node:child_process";
import { readdirSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { promisify } from "node:util";
import { expect, test } from "vitest";
import { parseTable, readTable } from "./table.ts";

const PYTHON = "/usr/bin/python3";
const run = promisify(execFile);
const scripts = fileURLToPath(new URL("./scripts/", import.meta.url));
const names = readdirSync(new URL("./tables/", import.meta.url)).map((file) => file.replace(/\.json$/, ""));

/** Set where the libraries cannot be: then, and only then, the committed tables stand alone. */
const toldAbsent = process.env.ALIDADE_REFERENCE_LIBRARIES === "absent";
const present = await run(PYTHON, ["-c", "import astropy, erfa, numpy, scipy"]).then(
  () => true,
  () => false,
);

// Another release of a library, or another processor, may round otherwise; a peak found by a minimiser moves by 1e-8.
const TOLERANCE = { usual: 1e-12, quantilesPc: 1e-9, peaks: 1e-6, fitted: 1e-9, tabulated: 1e-9 };

/** Like `expected` in everything, numbers to a tolerance; numbers near zero as a share of one. */
function expectAlike(actual: unknown, expected: unknown, tolerance: number, where: string): void {
  if (typeof actual === "number" && typeof expected === "number") {
    const alike = actual === expected || Math.abs(actual - expected) <= tolerance * Math.max(1, Math.abs(expected));
    expect(alike, `${where}: ${actual} against ${expected}`).toBe(true);
  } else if (expected !== null && typeof expected === "object") {
    expect(Object.keys(actual as object), where).toEqual(Object.keys(expected));
    for (const [key, value] of Object.entries(expected)) {
      const closer = key in TOLERANCE ? TOLERANCE[key as keyof typeof TOLERANCE] : tolerance;
      expectAlike((actual as Record<string, unknown>)[key], value, closer, `${where}.${key}`);
    }
  } else {
    expect(actual, where).toBe(expected);
  }
}

test("the libraries are here, or it has been said that they are not", () => {
  expect(
    present || toldAbsent,
    `${PYTHON} cannot import astropy, erfa, numpy and scipy: install python3-astropy, python3-erfa, python3-numpy ` +
      "and python3-scipy, or say so with ALIDADE_REFERENCE_LIBRARIES=absent",
  ).toBe(true);
});

test("there are tables to make again", () => {
  expect(names.length).toBeGreaterThanOrEqual(8);
});

for (const name of present ? names : []) {
  test(`${name}.py makes its committed table again`, async () => {
    const { stdout } = await run(PYTHON, ["-B", `${scripts}${name}.py`], { maxBuffer: 64 * 1024 * 1024 });
    const committed = readTable<object>(name);
    expect(Object.keys(committed.versions)).toContain("python");
    expectAlike(parseTable<object>(stdout).cases, committed.cases, TOLERANCE.usual, name);
  });
}
