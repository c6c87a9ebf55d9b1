import fc from "fast-check";
import { expect, test } from "vitest";
import { formatDecimal, parseDecimal, roundToScale } from "./decimal.ts";
import { type RoundingRule, roundWithError } from "./rounding.ts";

const round = (value: string, error: string, rule?: RoundingRule) => {
  const rounded = roundWithError(value, error, rule);
  return `${rounded.value}+-${rounded.error}`;
};

// Review of Particle Physics, section 5.3, and the worked cases that this project's methods list.
test.each([
  ["0.827", "0.119", "0.83+-0.12"],
  ["0.827", "0.354", "0.83+-0.35"],
  ["0.827", "0.355", "0.8+-0.4"],
  ["0.827", "0.367", "0.8+-0.4"],
  ["0.827", "0.950", "0.8+-1.0"],
  ["326.156", "3.262", "326.2+-3.3"],
  ["100", "0.0999", "100.00+-0.10"],
  ["9.9996", "0.00996", "10.000+-0.010"],
  ["1234.5", "99.6", "1230+-100"],
])("PDG: %s +- %s is %s", (value, error, expected) => {
  expect(round(value, error)).toBe(expected);
});

test("the error is rounded to three digits before the band is chosen", () => {
  expect(round("0.827", "0.3544")).toBe("0.83+-0.35");
  expect(round("0.827", "0.3545")).toBe("0.8+-0.4");
  expect(round("0.827", "0.9494")).toBe("0.8+-0.9");
  expect(round("0.827", "0.9495")).toBe("0.8+-1.0");
  expect(round("0.8274", "0.09996")).toBe("0.83+-0.10");
});

// JCGM 100:2008, 7.2.6: "it usually suffices to quote [uncertainties] to at most two significant digits"; its example
// in 7.2.6: 10.05762 ohm with 27 milliohm is quoted as 10.058 ohm.
test("GUM: at most two digits of uncertainty", () => {
  expect(round("10.05762", "0.027", "gum")).toBe("10.058+-0.027");
  expect(round("0.827", "0.367", "gum")).toBe("0.83+-0.37");
  expect(round("1234.5", "99.6", "gum")).toBe("1230+-100");
  expect(round("5", "0.0996", "gum")).toBe("5.00+-0.10");
});

test("halves go away from zero, on decimal text and not on doubles", () => {
  expect(formatDecimal(roundToScale(parseDecimal("1.005"), 2))).toBe("1.01");
  expect(formatDecimal(roundToScale(parseDecimal("-1.005"), 2))).toBe("-1.01");
  expect(formatDecimal(roundToScale(parseDecimal("2.5"), 0))).toBe("3");
  expect(formatDecimal(roundToScale(parseDecimal("-0.4"), 0))).toBe("0");
});

test("signs, exponents and leading zeros are read; anything else is refused", () => {
  expect(formatDecimal(parseDecimal("+007.50"))).toBe("7.50");
  expect(formatDecimal(parseDecimal("\u22121.2e-3"))).toBe("-0.0012");
  expect(formatDecimal(parseDecimal("12e2"))).toBe("1200");
  for (const wrong of ["", ".", "1,5", "0x10", "NaN", "1e", "--1", "1 2"]) {
    expect(() => parseDecimal(wrong), wrong).toThrow(RangeError);
  }
  expect(() => roundWithError("1", "0")).toThrow("above zero");
  expect(() => roundWithError("1", "-1")).toThrow("above zero");
});

const digits = fc.bigInt({ min: 1n, max: 999_999_999n });
const shift = (text: string, by: number) => {
  const decimal = parseDecimal(text);
  return formatDecimal({ digits: decimal.digits, scale: decimal.scale - by });
};
const plain = (text: string) => {
  const { digits: all, scale } = parseDecimal(text);
  if (all === 0n) return "0";
  let [value, place] = [all, scale];
  while (value !== 0n && value % 10n === 0n) [value, place] = [value / 10n, place - 1];
  return `${value}e${-place}`;
};

test("scaling by powers of ten moves only the place", () => {
  fc.assert(
    fc.property(
      fc.bigInt({ min: -999_999_999n, max: 999_999_999n }),
      digits,
      fc.integer({ min: -6, max: 6 }),
      fc.constantFrom<RoundingRule>("pdg", "gum"),
      (value, error, power, rule) => {
        const here = roundWithError(`${value}`, `${error}`, rule);
        const there = roundWithError(shift(`${value}`, power), shift(`${error}`, power), rule);
        expect(plain(there.value)).toBe(plain(shift(here.value, power)));
        expect(plain(there.error)).toBe(plain(shift(here.error, power)));
      },
    ),
  );
});

test("what is shown is within half a place of what is meant, and rounding again changes nothing", () => {
  fc.assert(
    fc.property(fc.bigInt({ min: -999_999_999n, max: 999_999_999n }), digits, (value, error) => {
      const shown = roundWithError(`${value}e-4`, `${error}e-4`);
      expect(Math.abs(Number(shown.error) - Number(error) / 1e4)).toBeLessThanOrEqual((0.15 * Number(error)) / 1e4);
      expect(Math.abs(Number(shown.value) - Number(value) / 1e4)).toBeLessThanOrEqual((0.15 * Number(error)) / 1e4);
      const places = (text: string) => text.split(".")[1]?.length ?? 0;
      expect(places(shown.value)).toBe(places(shown.error));
    }),
  );
});
