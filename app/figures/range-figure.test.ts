import fc from "fast-check";
import { expect, test } from "vitest";
import { compareDecimals, parseDecimal, timesTenTo } from "./decimal.ts";
import { parseShown, shownDigits } from "./language.ts";
import {
  distanceFigure,
  type FigureForm,
  lightTravelFigure,
  placeOfRange,
  type RangeNumbers,
  rangeFigure,
  roundRange,
} from "./range-figure.ts";
import { unitWord } from "./unit-words.ts";

const LY = 3.261563777167433;
/** Inverting p +- s (mas), in light-years. */
const inverted = (p: number, s: number) => ({
  value: (1000 / p) * LY,
  low: (1000 / (p + s)) * LY,
  high: (1000 / (p - s)) * LY,
});
const spaced = (text: string) => text.replaceAll("\u00a0", " ").replaceAll("\u202f", " ");

// The three visitor ranges that METHODS.md computes: 296.5-362.4, 479.6-639.5, 8.5653-8.6369 ly.
test("the project's three worked ranges round to one place each", () => {
  expect(roundRange(inverted(10, 1))).toEqual({ value: "326", low: "297", high: "362" });
  expect(roundRange(inverted(5.95, 0.85))).toEqual({ value: "550", low: "480", high: "640" });
  expect(roundRange(inverted(379.21, 1.58))).toEqual({ value: "8.60", low: "8.57", high: "8.64" });
});

test("a firm distance is a value with its range", () => {
  const figure = (form: FigureForm, language: "en" | "fr") =>
    spaced(distanceFigure({ distance: inverted(130.23, 0.36), regime: "firm", unit: "ly", form, language }).text);
  expect(figure("value", "en")).toBe("25.04 light-years");
  expect(figure("range", "en")).toBe("between 24.98 and 25.11 light-years");
  expect(figure("value-and-range", "en")).toBe("25.04 light-years (between 24.98 and 25.11)");
  expect(figure("value-and-range", "fr")).toBe("25,04 années-lumière (entre 24,98 et 25,11)");
});

test("the same distance in the other units, large and small, stays in digits", () => {
  const figure = (distance: RangeNumbers, unit: "ly" | "pc" | "au" | "km", language: "en" | "fr" = "en") =>
    spaced(distanceFigure({ distance, regime: "firm", unit, form: "value-and-range", language }).text);
  const around = (value: number, by: number) => ({ value, low: value - by, high: value + by });
  expect(figure(around(103.9, 0.8), "ly")).toBe("103.9 light-years (between 103.1 and 104.7)");
  expect(figure(around(1_627_000, 31_000), "ly")).toBe("1,627,000 light-years (between 1,596,000 and 1,658,000)");
  expect(figure(around(1_627_000, 31_000), "ly", "fr")).toBe("1 627 000 années-lumière (entre 1 596 000 et 1 658 000)");
  expect(figure(around(0.0000158, 0.0000004), "ly")).toBe("0.0000158 light-years (between 0.0000154 and 0.0000162)");
  expect(figure(around(1.0003, 0.0052), "pc", "fr")).toBe("1,000 parsec (entre 0,995 et 1,006)");
  expect(figure(around(206_265, 40), "au")).toBe("206,270 astronomical units (between 206,230 and 206,310)");
});

test("the unit of a range takes the plural of its last number", () => {
  const figure = (distance: RangeNumbers) =>
    spaced(distanceFigure({ distance, regime: "wide", unit: "ly", form: "range", language: "fr" }).text);
  expect(figure({ value: 2, low: 1.76, high: 2.31 })).toBe("entre 1,76 et 2,31 années-lumière");
  expect(figure({ value: 1.2, low: 1.04, high: 1.41 })).toBe("entre 1,04 et 1,41 année-lumière");
});

test("a number and its unit never part; the French groups are narrow no-break spaces", () => {
  const distance = { value: 12_345, low: 12_225, high: 12_465 };
  const input = { distance, regime: "firm", unit: "ly", form: "value-and-range", language: "fr" } as const;
  expect(distanceFigure(input).text).toBe("12\u202f350\u00a0années-lumière (entre 12\u202f230 et 12\u202f470)");
});

test("GUM's rule on request keeps two digits of the narrower side", () => {
  expect(roundRange(inverted(5.95, 0.85), "gum")).toEqual({ value: "548", low: "480", high: "640" });
});

test("a wide distance is a range in numbers only, whatever form is asked for", () => {
  for (const form of ["value", "range", "value-and-range"] as const) {
    const figure = distanceFigure({ distance: inverted(5.95, 0.85), regime: "wide", unit: "ly", form, language: "en" });
    expect(spaced(figure.text)).toBe("between 480 and 640 light-years");
    expect(figure.value).toBeNull();
  }
});

test("a prior-led distance says that it depends on the assumption", () => {
  const input = {
    distance: { value: 1503.7, low: 907.8, high: 2434.9 },
    regime: "prior-led",
    unit: "pc",
    form: "value",
  };
  const figure = (language: "en" | "fr") =>
    distanceFigure({ ...input, language } as Parameters<typeof distanceFigure>[0]);
  expect(spaced(figure("en").text)).toBe("between 900 and 2400 parsecs (depends on the assumption)");
  expect(figure("fr").note).toBe("dépend de l’hypothèse");
  expect(spaced(figure("fr").text)).toBe("entre 900 et 2400 parsecs (dépend de l’hypothèse)");
});

test("what a prior had a hand in says so in every regime, and nothing prior-led comes from 1/p", () => {
  const input = { distance: inverted(10, 1), unit: "ly", form: "value", language: "en" } as const;
  const firm = distanceFigure({ ...input, regime: "firm", method: "edsd" });
  expect(spaced(firm.text)).toBe("326 light-years (depends on the assumption)");
  expect(distanceFigure({ ...input, regime: "firm", method: "inverse" }).note).toBeNull();
  expect(() => distanceFigure({ ...input, regime: "prior-led", method: "inverse" })).toThrow("1/p");
});

test("light travel time is the number of the light-years, in years", () => {
  const figure = lightTravelFigure({
    distanceLy: inverted(130.23, 0.36),
    regime: "firm",
    form: "value",
    language: "fr",
  });
  expect(spaced(figure.text)).toBe("25,04 ans");
});

// Unicode CLDR plural rules: English "one" needs i = 1 and v = 0; French "one" is i = 0 or 1.
test("the plural follows the digits that are shown", () => {
  expect(unitWord("1", "ly", "en")).toBe("light-year");
  expect(unitWord("1.0", "ly", "en")).toBe("light-years");
  expect(unitWord("0.5", "ly", "en")).toBe("light-years");
  expect(unitWord("1.5", "ly", "fr")).toBe("année-lumière");
  expect(unitWord("1.0", "ly", "fr")).toBe("année-lumière");
  expect(unitWord("2", "ly", "fr")).toBe("années-lumière");
  expect(unitWord("1000000", "ly", "fr")).toBe("années-lumière");
});

test("numbers are grouped and marked as each language does it", () => {
  expect(shownDigits("-1234567.50", "en")).toBe("\u22121,234,567.50");
  expect(shownDigits("-1234567.50", "fr")).toBe("\u22121\u202f234\u202f567,50");
  expect(shownDigits("1234", "en")).toBe("1234");
});

test("an open or empty range is refused", () => {
  expect(() => roundRange({ value: 1, low: 0.5, high: Number.POSITIVE_INFINITY })).toThrow(RangeError);
  expect(() => roundRange({ value: 1, low: 1, high: 2 })).toThrow("low < value < high");
});

const ranges = fc
  .tuple(
    fc.double({ min: 1e-3, max: 1e9, noNaN: true }),
    fc.double({ min: 1e-6, max: 0.9, noNaN: true }),
    fc.double({ min: 1e-6, max: 5, noNaN: true }),
  )
  .map(([value, below, above]) => ({ value, low: value * (1 - below), high: value * (1 + above) }));

test("the shown range contains the shown value and never closes up", () => {
  fc.assert(
    fc.property(ranges, (range) => {
      const shown = roundRange(range);
      expect(Number(shown.low)).toBeLessThan(Number(shown.value));
      expect(Number(shown.value)).toBeLessThan(Number(shown.high));
    }),
    { numRuns: 2000 },
  );
});

test("scaling a range by powers of ten moves only the place", () => {
  // At most 15 digits, so that the scaled text and the double mean the same decimal number.
  const whole = fc.integer({ min: 1, max: 999_999_999 });
  fc.assert(
    fc.property(whole, whole, whole, fc.integer({ min: -12, max: 12 }), (low, below, above, power) => {
      const at = (by: number) => ({
        value: Number(`${low + below}e${by}`),
        low: Number(`${low}e${by}`),
        high: Number(`${low + below + above}e${by}`),
      });
      const [here, there] = [roundRange(at(0)), roundRange(at(power))];
      for (const end of ["value", "low", "high"] as const) {
        const moved = timesTenTo(parseDecimal(here[end]), power);
        expect(compareDecimals(parseDecimal(there[end]), moved)).toBe(0);
      }
      expect(placeOfRange(at(power))).toBe(placeOfRange(at(0)) - power);
    }),
    { numRuns: 1000 },
  );
});

test("parsing what is shown gives it back, in both languages", () => {
  fc.assert(
    fc.property(ranges, fc.constantFrom("en" as const, "fr" as const), (range, language) => {
      const plain = roundRange(range);
      const figure = rangeFigure({ range, regime: "firm", unit: "ly", form: "value-and-range", language });
      expect(parseShown(figure.low, language)).toBe(plain.low);
      expect(parseShown(figure.value ?? "", language)).toBe(plain.value);
      expect(parseShown(figure.high, language)).toBe(plain.high);
    }),
    { numRuns: 1000 },
  );
});

test("parsing refuses what is not shown like that", () => {
  for (const wrong of ["1.234,5", "12 345", "1e5", "", "12345", "1,234", "-1", "007,000"]) {
    expect(() => parseShown(wrong, "en"), wrong).toThrow(RangeError);
  }
  expect(() => parseShown("1.5", "fr")).toThrow(RangeError);
  expect(() => parseShown("12 345", "fr")).toThrow(RangeError);
});
