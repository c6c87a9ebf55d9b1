import fc from "fast-check";
import { expect, test } from "vitest";
import { distancePosterior, type Posterior, type Prior } from "./posterior.ts";

const powerOfTen = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true }).map((e) => 10 ** e);
const signed = (size: fc.Arbitrary<number>) => fc.tuple(fc.constantFrom(-1, 0, 1), size).map(([sign, n]) => sign * n);
const names = fc.constantFrom<Prior["name"]>("edsd", "uniform-density", "uniform-distance");

const priorOf = (name: Prior["name"], pc: number): Prior =>
  name === "edsd" ? { name, lengthPc: pc } : { name, limitPc: pc };
const quantilesOf = (found: Posterior) => [found.q05Pc, found.q16Pc, found.q50Pc, found.q84Pc, found.q95Pc];

test("quantiles are positive, in order and inside the limit over everything that is accepted", () => {
  const inputs = fc.tuple(signed(powerOfTen(-29.9, 29.9)), powerOfTen(-29.9, 29.9), names, powerOfTen(-29.9, 29.9));
  fc.assert(
    fc.property(inputs, ([parallaxMas, errorMas, name, pc]) => {
      const found = distancePosterior({ parallaxMas, errorMas, prior: priorOf(name, pc) });
      const quantiles = quantilesOf(found);
      expect(quantiles.every((r) => r > 0 && Number.isFinite(r))).toBe(true);
      for (let i = 1; i < 5; i++) expect(quantiles[i]!).toBeGreaterThanOrEqual(quantiles[i - 1]! * (1 - 1e-12));
      if (name !== "edsd") expect(Math.max(...quantiles, ...found.modesPc)).toBeLessThanOrEqual(pc);
      expect(found.modesPc).toContain(found.modePc);
      expect(found.modeShares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
    }),
    { numRuns: 2000 },
  );
});

test("parallax, error and 1/length times k puts every distance at 1/k", () => {
  const inputs = fc.tuple(signed(powerOfTen(-2, 2)), powerOfTen(-2, 1), names, powerOfTen(1, 4), powerOfTen(-3, 3));
  fc.assert(
    fc.property(inputs, ([parallaxMas, errorMas, name, pc, k]) => {
      const one = distancePosterior({ parallaxMas, errorMas, prior: priorOf(name, pc) });
      const other = distancePosterior({
        parallaxMas: parallaxMas * k,
        errorMas: errorMas * k,
        prior: priorOf(name, pc / k),
      });
      quantilesOf(one).forEach((r, i) => {
        expect(Math.abs((quantilesOf(other)[i]! * k) / r - 1)).toBeLessThan(1e-6);
      });
    }),
    { numRuns: 300 },
  );
});

test("a uniform distance that the parallax says nothing about keeps its own quantiles", () => {
  const found = distancePosterior({
    parallaxMas: 1e-9,
    errorMas: 1e9,
    prior: { name: "uniform-distance", limitPc: 1000 },
  });
  [50, 160, 500, 840, 950].forEach((r, i) => {
    expect(quantilesOf(found)[i]! / r).toBeCloseTo(1, 5);
  });
  expect(found.modePc).toBe(1000);
});

test("a uniform density that the parallax says nothing about keeps the cube roots of its quantiles", () => {
  const found = distancePosterior({ parallaxMas: 0, errorMas: 1e6, prior: { name: "uniform-density", limitPc: 1000 } });
  [0.05, 0.16, 0.5, 0.84, 0.95].forEach((q, i) => {
    expect(quantilesOf(found)[i]! / (1000 * Math.cbrt(q))).toBeCloseTo(1, 9);
  });
});

test("a narrow parallax brings back its own normal quantiles, whatever the prior", () => {
  for (const name of ["edsd", "uniform-density", "uniform-distance"] as const) {
    const found = distancePosterior({ parallaxMas: 100, errorMas: 1e-6, prior: priorOf(name, 1000) });
    expect(found.q16Pc).toBeCloseTo(1000 / (100 + 0.994457883e-6), 11);
    expect(found.q50Pc).toBeCloseTo(10, 11);
    expect(found.q95Pc).toBeCloseTo(1000 / (100 - 1.644853627e-6), 11);
    expect(found.modesPc).toHaveLength(1);
  }
});

test("a posterior with two peaks reports both, with what each one holds", () => {
  const found = distancePosterior({ parallaxMas: 20, errorMas: 5, prior: { name: "edsd", lengthPc: 1350 } });
  expect(found.modesPc).toHaveLength(2);
  expect(found.modePc).toBe(found.modesPc[0]);
  expect(found.modesPc[0]!).toBeCloseTo(58.319, 3);
  expect(found.modesPc[1]!).toBeCloseTo(2225.65, 2);
  expect(found.modeShares[0]!).toBeCloseTo(0.102, 3);
});

test("with a uniform density the limit is a second peak where anything is left there, and not where nothing is", () => {
  const prior = { name: "uniform-density", limitPc: 700 } as const;
  const wide = distancePosterior({ parallaxMas: 20, errorMas: 5, prior });
  expect(wide.modesPc).toEqual([expect.closeTo(58.5786, 4), 700]);
  expect(distancePosterior({ parallaxMas: 20, errorMas: 1, prior }).modesPc).toHaveLength(1);
});

test("a limit nearer than the parallax's own distance gathers everything below it", () => {
  const found = distancePosterior({
    parallaxMas: 10,
    errorMas: 0.1,
    prior: { name: "uniform-density", limitPc: 50 },
  });
  expect(found.modesPc).toEqual([50]);
  expect(found.q05Pc).toBeGreaterThan(49.9);
  expect(found.q95Pc).toBeLessThan(50);
});

test("impossible input is refused by name", () => {
  const good = { parallaxMas: 1, errorMas: 1, prior: { name: "edsd", lengthPc: 1350 } } as const;
  expect(() => distancePosterior({ ...good, parallaxMas: Number.NaN })).toThrow(/parallaxMas/);
  expect(() => distancePosterior({ ...good, errorMas: 0 })).toThrow(/errorMas must be above zero/);
  expect(() => distancePosterior({ ...good, prior: { name: "edsd", lengthPc: -1 } })).toThrow(/lengthPc must be above/);
  expect(() => distancePosterior({ ...good, prior: { name: "uniform-density", limitPc: 0 } })).toThrow(/limitPc/);
  expect(() =>
    distancePosterior({ ...good, prior: { name: "uniform-distance", limitPc: Number.POSITIVE_INFINITY } }),
  ).toThrow(/limitPc must be a finite number/);
  expect(() => distancePosterior({ ...good, prior: { name: "flat" } as unknown as Prior })).toThrow(/prior must be/);
});
