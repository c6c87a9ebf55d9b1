import { expect, test } from "vitest";
import { distancePosterior, type Prior } from "#app/astrometry/posterior.ts";
import { checkAll, expectClose } from "./check.ts";
import { readTable } from "./table.ts";

interface Case {
  parallaxMas: number;
  errorMas: number;
  prior: Prior;
  quantilesPc: number[];
  peaks: { distancePc: number; depth: number }[];
}

// scipy integrates to 1e-9 or better and solves to 1e-13, the quadrature here to about 1e-9; a quantile that falls in the dip
// between two peaks, or a limit a hair inside a narrow peak, multiplies either error. 1e-6 covers all of that and is
// a thousandth of what the best parallaxes can show. A peak is flat on top: a minimiser finds it to about 1e-8.
const TOLERANCE = 1e-6;

function checkPosterior(one: Case) {
  const found = distancePosterior(one);
  const quantiles = [found.q05Pc, found.q16Pc, found.q50Pc, found.q84Pc, found.q95Pc];
  quantiles.forEach((quantile, i) => {
    expectClose(quantile, one.quantilesPc[i]!, TOLERANCE);
  });
  const shown = one.peaks.filter(({ depth }) => depth < 40);
  for (const { distancePc } of shown) {
    const nearest = found.modesPc.reduce((a, b) => (Math.abs(b - distancePc) < Math.abs(a - distancePc) ? b : a));
    expectClose(nearest, distancePc, TOLERANCE);
  }
  expect(found.modesPc.length).toBeGreaterThanOrEqual(shown.length);
  // A peak that the grid's sixty nats do not reach is in the cubic all the same; it holds no probability.
  const surplus = found.modesPc.length - shown.length;
  expect(found.modeShares.filter((share) => share < 1e-9).length).toBeGreaterThanOrEqual(surplus);
  const highest = one.peaks.find(({ depth }) => depth === 0) ?? one.peaks[0]!;
  const published = one.prior.name === "edsd" ? found.modesPc[0]! : highest.distancePc;
  expectClose(found.modePc, published, TOLERANCE);
}

test("EDSD posteriors agree with scipy", () => {
  checkAll(readTable<Case>("posterior_edsd").cases, checkPosterior);
});

test("uniform-density posteriors agree with scipy", () => {
  checkAll(readTable<Case>("posterior_uniform_density").cases, checkPosterior);
});

test("uniform-distance posteriors agree with scipy", () => {
  checkAll(readTable<Case>("posterior_uniform_distance").cases, checkPosterior);
});

test("the tables hold posteriors with two peaks of weight, negative parallaxes and the whole span of errors", () => {
  const cases = readTable<Case>("posterior_edsd").cases;
  const two = cases.filter(({ peaks }) => peaks.filter(({ depth }) => depth < 5).length === 2);
  expect(two.length).toBeGreaterThan(10);
  expect(cases.filter(({ parallaxMas }) => parallaxMas < 0).length).toBeGreaterThan(30);
  const ratios = cases.filter(({ parallaxMas }) => parallaxMas > 0).map((one) => one.errorMas / one.parallaxMas);
  expect(Math.min(...ratios)).toBeLessThan(2e-5);
  expect(Math.max(...ratios)).toBeGreaterThan(20);
});
