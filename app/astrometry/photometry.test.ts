import { expect, test } from "vitest";
import { linearSrgbFromTemperature, temperatureFromBv } from "./photometry.ts";

test("the Sun's colour gives the Sun's temperature", () => {
  expect(temperatureFromBv(0.65)).toBeCloseTo(5778.4, 1);
});

test("redder stars are cooler", () => {
  const temperatures = [-0.4, -0.2, 0, 0.5, 1, 1.5, 2].map(temperatureFromBv);
  expect(temperatures).toEqual([...temperatures].sort((a, b) => b - a));
});

test("colours beyond the formula's pole are refused", () => {
  expect(() => temperatureFromBv(-0.674)).toThrow(/bv/);
  expect(() => temperatureFromBv(Number.NaN)).toThrow(/bv/);
});

test("cool bodies are red, hot ones blue, and 6500 K is nearly white", () => {
  const [, , coolBlue] = linearSrgbFromTemperature(1500);
  expect(coolBlue).toBe(0);
  expect(linearSrgbFromTemperature(3000)[0]).toBe(1);
  expect(linearSrgbFromTemperature(20_000)[2]).toBe(1);
  expect(Math.min(...linearSrgbFromTemperature(6500))).toBeGreaterThan(0.93);
});

test("every temperature gives channels within 0 and 1, the largest one", () => {
  for (let exponent = -300; exponent <= 300; exponent += 0.5) {
    const rgb = linearSrgbFromTemperature(10 ** exponent);
    expect(Math.max(...rgb)).toBe(1);
    expect(Math.min(...rgb)).toBeGreaterThanOrEqual(0);
  }
  expect(linearSrgbFromTemperature(1)).toEqual([1, 0, 0]);
});

test("what is no temperature is refused", () => {
  for (const kelvin of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
    expect(() => linearSrgbFromTemperature(kelvin)).toThrow(/kelvin/);
  }
});
