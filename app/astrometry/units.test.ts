import { expect, test } from "vitest";
import { type AngleUnit, convertAngle, convertLength, type LengthUnit, PC_AU } from "./units.ts";

test("whole ratios lose nothing", () => {
  expect(convertAngle(20, "uas", "mas")).toBe(0.02);
  expect(convertAngle(0.77, "arcsec", "mas")).toBe(770);
  expect(convertAngle(1, "deg", "arcsec")).toBe(3600);
  expect(convertLength(1, "au", "m")).toBe(149_597_870_700);
  expect(convertLength(3, "kpc", "pc")).toBe(3000);
});

test("a parsec is 648000/pi au, and a radian as many arcseconds", () => {
  expect(convertLength(1, "pc", "au")).toBe(PC_AU);
  expect(convertAngle(1, "rad", "arcsec")).toBe(PC_AU);
});

test("signs, zero and infinities pass", () => {
  expect(convertLength(-2, "kpc", "pc")).toBe(-2000);
  expect(convertLength(0, "pc", "ly")).toBe(0);
  expect(convertLength(Number.POSITIVE_INFINITY, "pc", "ly")).toBe(Number.POSITIVE_INFINITY);
});

test("the largest and smallest doubles do not overflow on the way", () => {
  expect(convertLength(1e300, "pc", "kpc")).toBeCloseTo(1e297, -284);
  expect(convertLength(Number.MIN_VALUE, "pc", "pc")).toBe(Number.MIN_VALUE);
});

test("what is no number or no unit is refused by name", () => {
  expect(() => convertLength(Number.NaN, "pc", "ly")).toThrow(new RangeError("length value must be a number"));
  expect(() => convertLength(1, "furlong" as LengthUnit, "pc")).toThrow(/length unit "furlong" is not known/);
  expect(() => convertAngle(1, "deg", "toString" as AngleUnit)).toThrow(/angle unit "toString" is not known/);
});
