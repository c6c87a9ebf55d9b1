import { expect, test } from "vitest";
import { distanceFromParallax } from "./distance.ts";
import { PC_AU, PC_LY } from "./units.ts";

const prior = { name: "edsd", lengthPc: 1350 } as const;

test("without a prior a firm or wide parallax answers by inversion", () => {
  const answer = distanceFromParallax({ parallaxMas: 10, errorMas: 1 });
  expect(answer).toMatchObject({ regime: "firm", method: "inverse", fractionalError: 0.1, modes: [100], reason: null });
  expect(answer.pc).toMatchObject({ value: 100, mode: 100, low: 1000 / 11, high: 1000 / 9 });
  expect(distanceFromParallax({ parallaxMas: 5, errorMas: 1 })).toMatchObject({ regime: "wide", method: "inverse" });
});

test("without a prior a prior-led parallax answers nothing but the reason", () => {
  const answer = distanceFromParallax({ parallaxMas: 1, errorMas: 1, prior: null });
  expect(answer).toMatchObject({ regime: "prior-led", method: null, pc: null, ly: null, au: null, modes: [] });
  expect(answer.reason).toMatch(/more than a fifth of the parallax/);
  expect(distanceFromParallax({ parallaxMas: -1, errorMas: 0.1 }).reason).toMatch(/not above zero/);
  expect(distanceFromParallax({ parallaxMas: 0, errorMas: 0.1 }).fractionalError).toBe(Number.POSITIVE_INFINITY);
});

test("with a prior the posterior answers in every regime", () => {
  for (const [parallaxMas, errorMas, regime] of [
    [130.23, 0.36, "firm"],
    [5, 1, "wide"],
    [-0.4, 0.9, "prior-led"],
  ] as const) {
    const answer = distanceFromParallax({ parallaxMas, errorMas, prior });
    expect(answer).toMatchObject({ regime, method: "edsd", reason: null });
    const { value, low, high, low90, high90 } = answer.pc!;
    expect([low90, low, value, high, high90]).toEqual([low90, low, value, high, high90].sort((a, b) => a - b));
  }
});

test("light-years and au are the parsecs' quantiles, transformed", () => {
  const answer = distanceFromParallax({ parallaxMas: 1, errorMas: 1, prior });
  for (const part of ["value", "low", "high", "low90", "high90", "mode"] as const) {
    expect(answer.ly![part]).toBe(answer.pc![part] * PC_LY);
    expect(answer.au![part]).toBe(answer.pc![part] * PC_AU);
  }
});

test("two peaks are in the answer, nearest first", () => {
  const answer = distanceFromParallax({ parallaxMas: 20, errorMas: 5, prior });
  expect(answer.modes).toHaveLength(2);
  expect(answer.pc!.mode).toBe(answer.modes[0]);
  expect(answer.modeShares).toHaveLength(2);
});

test("impossible input is refused by name", () => {
  expect(() => distanceFromParallax({ parallaxMas: Number.NaN, errorMas: 1 })).toThrow(/parallaxMas/);
  expect(() => distanceFromParallax({ parallaxMas: 1, errorMas: -1 })).toThrow(/errorMas/);
  expect(() => distanceFromParallax({ parallaxMas: 1, errorMas: 1, prior: { name: "edsd", lengthPc: 0 } })).toThrow(
    /lengthPc/,
  );
});
