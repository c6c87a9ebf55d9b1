import { expect, test } from "vitest";
import { type AngleUnit, convertAngle, convertLength, type LengthUnit } from "#app/astrometry/units.ts";
import { checkAll, expectClose } from "./check.ts";
import { readTable } from "./table.ts";

type Case = { what: string; value: number; expected: number } & (
  | { what: "length"; from: LengthUnit; to: LengthUnit }
  | { what: "angle"; from: AngleUnit; to: AngleUnit }
);

// Both sides multiply by definitions that are exact: a few roundings of 1e-16 are all that may differ.
const TOLERANCE = 1e-12;

test("lengths and angles agree with astropy.units, every unit to every other", () => {
  const { cases } = readTable<Case>("units");
  checkAll(cases, (one) => {
    const found =
      one.what === "length" ? convertLength(one.value, one.from, one.to) : convertAngle(one.value, one.from, one.to);
    expectClose(found, one.expected, TOLERANCE);
  });
  expect(new Set(cases.map(({ from, to }) => `${from} ${to}`)).size).toBe(7 * 7 + 6 * 6);
});
