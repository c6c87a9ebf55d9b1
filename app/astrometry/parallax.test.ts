import { expect, test } from "vitest";
import { invertParallax, regimeOf } from "./parallax.ts";

test("a tenth is firm, a fifth is wide, more is prior-led", () => {
  expect(regimeOf(10, 1)).toBe("firm");
  expect(regimeOf(10, 1.0001)).toBe("wide");
  expect(regimeOf(5, 1)).toBe("wide");
  expect(regimeOf(5, 1.0001)).toBe("prior-led");
});

test("a parallax on the limit as written is inside it, whatever the doubles make of the ratio", () => {
  for (let hundredths = 1; hundredths <= 20_000; hundredths++) {
    const parallax = hundredths / 100;
    expect(regimeOf(parallax, Number(`${hundredths}e-3`))).toBe("firm");
    expect(regimeOf(parallax, Number(`${2 * hundredths}e-3`))).toBe("wide");
  }
});

test("zero and negative parallaxes are prior-led however small the error", () => {
  expect(regimeOf(0, 0.001)).toBe("prior-led");
  expect(regimeOf(-10, 0.001)).toBe("prior-led");
});

test("inversion gives 1/p with its two ranges", () => {
  const found = invertParallax(10, 1);
  expect(found.valuePc).toBe(100);
  expect(found.lowPc).toBe(1000 / 11);
  expect(found.highPc).toBe(1000 / 9);
  expect(found.low90Pc).toBeCloseTo(85.8748, 4);
  expect(found.high90Pc).toBeCloseTo(119.6867, 4);
});

test("the far end is infinite where the parallax less its error is not above zero", () => {
  expect(invertParallax(1, 1).highPc).toBe(Number.POSITIVE_INFINITY);
  expect(invertParallax(1, 0.7).high90Pc).toBe(Number.POSITIVE_INFINITY);
  expect(invertParallax(1, 0.7).highPc).toBeCloseTo(1000 / 0.3, 8);
});

test("impossible input is refused by name", () => {
  expect(() => regimeOf(Number.NaN, 1)).toThrow(/parallaxMas must be a finite number/);
  expect(() => regimeOf(1, 0)).toThrow(/errorMas must be above zero/);
  expect(() => regimeOf(1, -1)).toThrow(/errorMas must be above zero/);
  expect(() => regimeOf(1, Number.POSITIVE_INFINITY)).toThrow(/errorMas must be a finite number/);
  expect(() => regimeOf(1, Number.MIN_VALUE)).toThrow(/errorMas must be between 1e-30 and 1e30/);
  expect(() => regimeOf(1e31, 1)).toThrow(/parallaxMas must be between -1e30 and 1e30/);
  expect(() => invertParallax(0, 1)).toThrow(/parallaxMas must be above zero/);
  expect(() => invertParallax(-1, 1)).toThrow(RangeError);
});
