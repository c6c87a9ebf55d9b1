import fc from "fast-check";
import { expect, test } from "vitest";
import { lightLeftFigure } from "./light-left.ts";
import type { FigureForm, RangeNumbers } from "./range-figure.ts";

const spaced = (text: string) => text.replaceAll("\u00a0", " ").replaceAll("\u202f", " ");
const left = (
  distanceLy: RangeNumbers,
  form: FigureForm = "range",
  language: "en" | "fr" = "en",
  regime: "firm" | "wide" | "prior-led" = "firm",
) => spaced(lightLeftFigure({ distanceLy, seenInYear: 2026, regime, form, language }).text);

// METHODS: 379.21 +- 1.58 mas is 8.5653-8.6369 ly. Seen from 2026.0 to 2027.0, the light left from 2017.36 to 2018.43.
test("near stars: the calendar years that it can be, for the whole year of seeing", () => {
  const near = { value: 8.6009, low: 8.5653, high: 8.6369 };
  expect(left(near)).toBe("between 2017 and 2018");
  expect(left(near, "value")).toBe("in 2017");
  expect(left(near, "value-and-range", "fr")).toBe("en 2017 (entre 2017 et 2018)");
});

// 5.95 +- 0.85 mas is 479.6-639.5 ly: 1386.5 to 1547.4, to tens as the distance itself.
test("a wide distance leaves a range of years only, to the place of the distance", () => {
  const wide = { value: 548.2, low: 479.6, high: 639.5 };
  expect(left(wide, "value", "en", "wide")).toBe("between 1390 and 1550");
  expect(left(wide, "value", "fr", "prior-led")).toBe("entre 1390 et 1550 (dépend de l’hypothèse)");
});

test("a firm distance whose years are rounded says around, not in", () => {
  const far = { value: 997, low: 950, high: 1049 };
  expect(left(far, "value-and-range")).toBe("around 1030 (between 980 and 1080)");
  expect(left(far, "value", "fr")).toBe("vers 1030");
});

test("before the first year the era is said, once where it is one", () => {
  // 2026 - 2600 is -574 on the astronomers' count, 575 BCE, and halves go away from zero.
  expect(left({ value: 2500, low: 2400, high: 2600 })).toBe("between 580 and 370 BCE");
  expect(left({ value: 2050, low: 1980, high: 2118 })).toBe("between 90 BCE and 50 CE");
  expect(left({ value: 2050, low: 1980, high: 2118 }, "range", "fr")).toBe(
    "entre 90 avant notre ère et 50 de notre ère",
  );
  expect(left({ value: 161_700, low: 160_000, high: 163_500 })).toBe("between 161,500 and 158,000 BCE");
});

test("a year that is not whole, or an empty range, is refused", () => {
  const input = { regime: "firm", form: "range", language: "en" } as const;
  const distanceLy = { value: 10, low: 9, high: 11 };
  expect(() => lightLeftFigure({ ...input, distanceLy, seenInYear: 2026.5 })).toThrow("whole year");
  expect(() => lightLeftFigure({ ...input, distanceLy: { ...distanceLy, low: 10 }, seenInYear: 2026 })).toThrow(
    RangeError,
  );
});

/** "575 BCE" and "161,500 BCE" on the astronomers' count. */
const astronomical = (shown: string) => {
  const count = Number(shown.replaceAll(",", "").replace(" BCE", ""));
  return shown.endsWith("BCE") ? 1 - count : count;
};

test("the shown years contain the shown year, and stay two where they are whole years", () => {
  const spread = fc.double({ min: 1e-6, max: 0.5, noNaN: true });
  fc.assert(
    fc.property(fc.double({ min: 1, max: 1e7, noNaN: true }), spread, spread, (value, below, above) => {
      const distanceLy = { value, low: value * (1 - below), high: value * (1 + above) };
      const figure = lightLeftFigure({ distanceLy, seenInYear: 2026, regime: "firm", form: "range", language: "en" });
      const [low, year, high] = [figure.low, figure.value ?? "", figure.high].map(astronomical);
      expect(low).toBeLessThanOrEqual(year ?? Number.NaN);
      expect(year).toBeLessThanOrEqual(high ?? Number.NaN);
      expect(low).toBeLessThan(high ?? Number.NaN);
    }),
    { numRuns: 2000 },
  );
});
