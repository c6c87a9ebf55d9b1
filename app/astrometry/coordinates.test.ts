import fc from "fast-check";
import { expect, test } from "vitest";
import {
  angularSeparationDeg,
  galacticXyz,
  icrsToGalactic,
  icrsUnitVector,
  parseDeclination,
  parseRightAscension,
} from "./coordinates.ts";

test("a right ascension is read in degrees, in parts of hours and with marks", () => {
  for (const text of [
    "269.45",
    "17 57 48",
    "17:57:48",
    "17h57m48s",
    " 17H 57M 48S ",
    "17h57m48",
    "17ʰ57ᵐ48ˢ",
    "269°27′",
    "269d27m00s",
    "269.45 deg",
  ]) {
    expect(parseRightAscension(text)).toBeCloseTo(269.45, 12);
  }
  expect(parseRightAscension("17h")).toBe(255);
  expect(parseRightAscension("17 57.8")).toBeCloseTo(269.45, 12);
});

test("a declination keeps its sign where the degrees are zero", () => {
  for (const text of ["-00 30 00", "−00 30 00", "-0:30", "-0°30′", "- 00 30 00.0", "-0d30m0s", "-0.5", "-00°30'00''"]) {
    expect(parseDeclination(text)).toBe(-0.5);
  }
  expect(parseDeclination("+00 30 00")).toBe(0.5);
  expect(parseDeclination("-0 0 0")).toBe(0);
  expect(parseDeclination("4.5E-5")).toBe(4.5e-5);
  expect(parseDeclination("-90 00 00")).toBe(-90);
});

test("what goes beyond the sky is refused with the text and the reason", () => {
  expect(() => parseRightAscension("24 00 00")).toThrow(/"24 00 00": .* below 24 hours/);
  expect(() => parseRightAscension("360")).toThrow(/below 360 degrees/);
  expect(() => parseRightAscension("-1")).toThrow(/never negative/);
  expect(() => parseDeclination("90 00 01")).toThrow(/between -90 and 90 degrees/);
  expect(() => parseDeclination("4h30m")).toThrow(/not in hours/);
  expect(() => parseDeclination("12 60 00")).toThrow(/minutes must be below 60/);
  expect(() => parseRightAscension("12 00 60.0")).toThrow(/seconds must be below 60/);
});

test("what is no angle is refused", () => {
  for (const text of [
    "",
    " ",
    "-",
    "abc",
    "12 30 15 10",
    "12,5",
    "12h30'",
    "1.5 30",
    "12:30 15",
    "5'30\"",
    "NaN",
    "1e5e2",
  ]) {
    expect(() => parseDeclination(text), text).toThrow(RangeError);
  }
});

test("no text makes anything but a direction or a RangeError", () => {
  fc.assert(
    fc.property(fc.string({ unit: fc.constantFrom(..."0159 .:-+hmsd°′″'\"eE") }), (text) => {
      for (const [parse, low, high] of [
        [parseRightAscension, 0, 360],
        [parseDeclination, -90, 90],
      ] as const) {
        try {
          const degrees = parse(text);
          expect(degrees >= low && degrees <= high).toBe(true);
        } catch (error) {
          if (!(error instanceof RangeError)) throw error;
        }
      }
    }),
    { numRuns: 1000 },
  );
});

test("the Galactic centre and pole are where they were put", () => {
  expect(icrsToGalactic(266.40499, -28.93617).bDeg).toBeCloseTo(0, 4);
  expect(icrsToGalactic(192.85948, 27.12825).bDeg).toBeCloseTo(90, 3);
  expect(galacticXyz(266.40499, -28.93617, 8000).x).toBeCloseTo(8000, 4);
});

test("turning to Galactic axes keeps lengths and separations", () => {
  const angle = fc.double({ min: 0, max: 360, noNaN: true });
  const latitude = fc.double({ min: -90, max: 90, noNaN: true });
  fc.assert(
    fc.property(angle, latitude, angle, latitude, (ra1, dec1, ra2, dec2) => {
      const { x, y, z } = galacticXyz(ra1, dec1, 10);
      expect(Math.hypot(x, y, z)).toBeCloseTo(10, 12);
      const [a, b] = [icrsToGalactic(ra1, dec1), icrsToGalactic(ra2, dec2)];
      const turned = angularSeparationDeg(a.lDeg, a.bDeg, b.lDeg, b.bDeg);
      expect(turned).toBeCloseTo(angularSeparationDeg(ra1, dec1, ra2, dec2), 10);
    }),
  );
});

test("separations are sharp at nought, at a right angle and at half a turn", () => {
  expect(angularSeparationDeg(10, 20, 10, 20)).toBe(0);
  expect(angularSeparationDeg(0, 0, 1e-9, 0)).toBeCloseTo(1e-9, 20);
  expect(angularSeparationDeg(0, 0, 90, 0)).toBe(90);
  expect(angularSeparationDeg(0, 90, 123, -90)).toBe(180);
});

test("impossible directions are refused by name", () => {
  expect(() => icrsUnitVector(Number.NaN, 0)).toThrow(/raDeg/);
  expect(() => icrsUnitVector(0, 90.001)).toThrow(/decDeg/);
  expect(() => galacticXyz(0, 0, -1)).toThrow(/distance/);
  expect(() => galacticXyz(0, 0, Number.POSITIVE_INFINITY)).toThrow(/distance/);
});
