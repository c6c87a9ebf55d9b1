import { expect, test } from "vitest";
import {
  declinationText,
  epochText,
  measurementText,
  percentText,
  plainNumber,
  rightAscensionText,
  significantNumber,
} from "./office-numbers.ts";
import { scaleText } from "./scale-text.ts";

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
  expect(plainNumber("2.50", "fr")).toBe("2,50");
  expect(spaced(percentText(0.0027643, "en"))).toBe("0.28 %");
  expect(spaced(percentText(0.142857, "fr"))).toBe("14,3 %");
  expect(significantNumber(0.00012345, 3, "en")).toBe("0.000123");
  expect(significantNumber(98765, 2, "en")).toBe("99,000");
  expect(significantNumber(0, 3, "en")).toBe("0");
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
});

test("epochs and scale bars", () => {
  expect(epochText("1991.25")).toBe("J1991.25");
  expect(spaced(scaleText(20, "ly", "en"))).toBe("20 light-years");
  expect(spaced(scaleText(0.5, "pc", "fr"))).toBe("0,5 parsec");
});
