import fc from "fast-check";
import { expect, test } from "vitest";
import { parseShown } from "./language.ts";
import {
  degreesText,
  epochText,
  measurementText,
  percentText,
  plainNumber,
  significantNumber,
} from "./office-numbers.ts";
import { scaleText } from "./scale-text.ts";
import { declinationText, rightAscensionText } from "./sexagesimal-text.ts";
import { yearText } from "./year-text.ts";

const spaced = (text: string) => text.replaceAll("\u00a0", " ");

test("a measurement keeps the digits its source printed", () => {
  const text = (value: string, error: string | null) =>
    spaced(measurementText({ value, error, unit: "mas", language: "en" }));
  expect(text("100.0", "1.50")).toBe("100.0 ± 1.50 mas");
  expect(text("-0.40", null)).toBe("\u22120.40 mas");
  expect(spaced(measurementText({ value: "130.23", error: "0.36", unit: "mas", language: "fr" }))).toBe(
    "130,23 ± 0,36 mas",
  );
});

test("counts, percents and significant digits", () => {
  expect(plainNumber(12345, "en")).toBe("12,345");
  expect(plainNumber(2.345, "en", 2)).toBe("2.35");
  expect(plainNumber(2.345, "en")).toBe("2.345");
  expect(plainNumber("-0.40", "en")).toBe("\u22120.40");
  expect(plainNumber(-0.4, "en", 0)).toBe("0");
  expect(plainNumber("2.50", "fr")).toBe("2,50");
  expect(spaced(percentText(0.0027643, "en"))).toBe("0.28 %");
  expect(spaced(percentText(0.142857, "fr"))).toBe("14,3 %");
  expect(significantNumber(0.00012345, 3, "en")).toBe("0.000123");
  expect(significantNumber(98765, 2, "en")).toBe("99,000");
  expect(significantNumber(0, 3, "en")).toBe("0");
  expect(significantNumber(99.96, 3, "en")).toBe("100");
  expect(significantNumber(20, 3, "en")).toBe("20.0");
  expect(significantNumber(-1.5e-9, 1, "en")).toBe("\u22120.000000002");
  expect(spaced(percentText(0.09999, "en"))).toBe("10 %");
  expect(() => plainNumber(Number.NaN, "en")).toThrow(RangeError);
  expect(() => percentText(Number.POSITIVE_INFINITY, "en")).toThrow(RangeError);
});

// Vega, ICRS at J1991.25, Hipparcos (ESA 1997): 18 36 56.19 +38 46 58.8, that is 279.23410832 and 38.78299311 degrees.
test("coordinates in degrees are shown in hours and degrees of arc", () => {
  expect(spaced(rightAscensionText(279.23410832, "en"))).toBe("18h 36m 56.19s");
  expect(spaced(declinationText(38.78299311, "en"))).toBe("+38° 46′ 58.8″");
});

test("a declination between 0 and -1 degree keeps its sign, and seconds carry", () => {
  expect(spaced(declinationText(-0.5, "en"))).toBe("\u221200° 30′ 00.0″");
  expect(spaced(declinationText(9.99999999, "en"))).toBe("+10° 00′ 00.0″");
  expect(spaced(rightAscensionText(359.9999999, "en"))).toBe("00h 00m 00.00s");
  expect(spaced(rightAscensionText(359.9999999, "en", 5))).toBe("23h 59m 59.99998s");
  expect(spaced(declinationText(-1e-9, "fr"))).toBe("+00° 00′ 00,0″");
  expect(spaced(declinationText(-60.83397, "fr", 2))).toBe("\u221260° 50′ 02,29″");
  expect(() => rightAscensionText(360.1, "en")).toThrow("0 to 360");
  expect(() => declinationText(Number.NaN, "en")).toThrow("-90 to 90");
});

test("epochs and scale bars", () => {
  expect(epochText("1991.25")).toBe("J1991.25");
  expect(epochText("2000.0")).toBe("J2000.0");
  expect(degreesText(31.0086971, "fr")).toBe("31,01°");
  expect(spaced(scaleText(20, "ly", "en"))).toBe("20 light-years");
  expect(spaced(scaleText(0.5, "pc", "fr"))).toBe("0,5 parsec");
});

test("years are not grouped below five digits, and there is no year 0", () => {
  expect(yearText(2017, "en")).toBe("2017");
  expect(yearText(0, "en")).toBe("1 BCE");
  expect(yearText(-574, "fr")).toBe("575 avant notre ère");
  expect(yearText(-160_000, "en")).toBe("160,001 BCE");
  expect(() => yearText(2000.5, "en")).toThrow("whole year");
});

test("a coordinate that is shown is within half of its last digit of what is meant", () => {
  const sum = (text: string) => {
    const [d = 0, m = 0, s = 0] = (text.match(/[\d.]+/g) ?? []).map(Number);
    return (text.startsWith("\u2212") ? -1 : 1) * (d * 3600 + m * 60 + s);
  };
  fc.assert(
    fc.property(
      fc.double({ min: -90, max: 90, noNaN: true }),
      fc.double({ min: 0, max: 359.9999, noNaN: true }),
      (decDeg, raDeg) => {
        // 1e-9: the doubles of this test's own sum.
        expect(Math.abs(sum(declinationText(decDeg, "en")) - decDeg * 3600)).toBeLessThanOrEqual(0.05 + 1e-9);
        expect(Math.abs(sum(rightAscensionText(raDeg, "en")) - raDeg * 240)).toBeLessThanOrEqual(0.005 + 1e-9);
      },
    ),
  );
});

test("an office number that is shown reads back as the very same double", () => {
  const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
  fc.assert(
    fc.property(finite, fc.constantFrom("en" as const, "fr" as const), (value, language) => {
      expect(Number(parseShown(plainNumber(value, language), language)) + 0).toBe(value + 0);
    }),
    { numRuns: 1000 },
  );
});
