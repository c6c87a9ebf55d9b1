import { requireBounded, requirePositive } from "./bounds.ts";
import { type AnchoredDensity, anchoredDensity, type Shape } from "./posterior-density.ts";
import { DEPTH, probabilityMass, quantile, type Stretch, shareBelow } from "./probability-mass.ts";
import { stationaryPoints } from "./stationary-points.ts";

/**
 * What is taken to be known of a distance before its parallax: an exponentially decreasing space density of a length,
 * a uniform space density up to a limit, or a uniform distance up to a limit.
 */
export type Prior =
  | { name: "edsd"; lengthPc: number }
  | { name: "uniform-density"; limitPc: number }
  | { name: "uniform-distance"; limitPc: number };

export interface Posterior {
  modePc: number;
  /** Every peak, ascending. */
  modesPc: number[];
  /** The probability of each peak's side of the dip between them; sums to one. */
  modeShares: number[];
  q05Pc: number;
  q16Pc: number;
  q50Pc: number;
  q84Pc: number;
  q95Pc: number;
}

export interface PosteriorInput {
  parallaxMas: number;
  errorMas: number;
  prior: Prior;
}

/** Parallaxes in mas make distances in kpc. */
const KPC_PC = 1000;

function shapeOf({ parallaxMas, errorMas, prior }: PosteriorInput): Shape {
  requireBounded("parallaxMas", parallaxMas);
  requirePositive("errorMas", errorMas);
  const snr = parallaxMas / errorMas;
  const none = Number.POSITIVE_INFINITY;
  switch (prior.name) {
    case "edsd":
      requirePositive("lengthPc", prior.lengthPc);
      return { power: 2, snr, scale: (prior.lengthPc / KPC_PC) * errorMas, limit: none };
    case "uniform-density":
    case "uniform-distance":
      requirePositive("limitPc", prior.limitPc);
      return {
        power: prior.name === "uniform-density" ? 2 : 0,
        snr,
        scale: none,
        limit: (prior.limitPc / KPC_PC) * errorMas,
      };
    default:
      throw new RangeError("prior must be edsd, uniform-density or uniform-distance");
  }
}

/** Rising and falling stretches of the log density in ln r, along v. */
function stretchesOf(turns: number[], end: number): Stretch[] {
  const ends = [Number.NEGATIVE_INFINITY, ...turns, end];
  return ends.slice(1).map((to, i) => (i % 2 === 0 ? { top: to, bottom: ends[i]! } : { top: ends[i]!, bottom: to }));
}

interface Peaks {
  /** Ascending, along v. */
  tops: number[];
  dip: number | null;
  highest: number;
}

/**
 * Peaks of the density in r (not in ln r). The limit is one where the density still rises there, unless, counted in
 * ln r, that rise ends more than DEPTH nats below the other peak: no probability is left there, nor is it integrated.
 */
function peaksOf(shape: Shape, log: AnchoredDensity, along: (x: number) => number, end: number): Peaks {
  const height = (v: number) => log.at(v) - v;
  const turns = stationaryPoints(shape.power, shape.snr, shape.scale)
    .filter((x) => x < shape.limit)
    .map(along);
  const tops = turns.filter((_, i) => i % 2 === 0);
  const risesAtEnd = turns.length % 2 === 0;
  const shows = tops.every((v) => log.at(end) >= log.at(v) - DEPTH);
  if (risesAtEnd && shows) tops.push(end);
  const highest = tops.reduce((best, v) => (height(v) > height(best) ? v : best));
  return { tops, dip: tops.length > 1 ? turns[1]! : null, highest };
}

/**
 * The posterior of a distance: its peaks, median, and the 5th, 16th, 84th and 95th percentiles, by quadrature in ln r.
 *
 * With two peaks `modePc` is, for the exponential prior, the nearer, as published; for the uniform priors, the higher.
 * `modesPc` has both, whatever their weight: `modeShares` says how much of the probability each one holds.
 * Agreement with scipy: 1e-6 relative or better (tests/reference).
 * @param input parallax (any sign) and its standard error in mas; the prior's length or limit in pc, above zero
 * @throws RangeError naming the parameter that is not finite, not above zero, or beyond 1e30
 * @source Bailer-Jones 2015 (PASP 127, 994); Astraatmadja & Bailer-Jones 2016 (ApJ 832, 137)
 */
export function distancePosterior(input: PosteriorInput): Posterior {
  const shape = shapeOf(input);
  const turnsX = stationaryPoints(shape.power + 1, shape.snr, shape.scale).filter((x) => x < shape.limit);
  const anchor = turnsX[0] ?? shape.limit;
  const log = anchoredDensity(shape, anchor, turnsX.length > 0);
  const along = (x: number) => Math.log(x / anchor);
  const end = along(shape.limit);

  const stretches = stretchesOf(turnsX.map(along), end);
  const peaks = peaksOf(shape, log, along, end);
  const highest = Math.max(...stretches.map(({ top }) => log.at(top)));
  const mass = probabilityMass(log, stretches, highest, peaks.dip === null ? [] : [peaks.dip]);

  const farthestPc = input.prior.name === "edsd" ? Number.POSITIVE_INFINITY : input.prior.limitPc;
  const anchorPc = turnsX.length > 0 ? (anchor / input.errorMas) * KPC_PC : farthestPc;
  const distancePc = (v: number) => (v === end ? farthestPc : Math.min(anchorPc * Math.exp(v), farthestPc));
  const nearerShare = peaks.dip === null ? 1 : shareBelow(mass, peaks.dip);
  return {
    modePc: distancePc(input.prior.name === "edsd" ? peaks.tops[0]! : peaks.highest),
    modesPc: peaks.tops.map(distancePc),
    modeShares: peaks.dip === null ? [1] : [nearerShare, 1 - nearerShare],
    q05Pc: distancePc(quantile(mass, 0.05)),
    q16Pc: distancePc(quantile(mass, 0.16)),
    q50Pc: distancePc(quantile(mass, 0.5)),
    q84Pc: distancePc(quantile(mass, 0.84)),
    q95Pc: distancePc(quantile(mass, 0.95)),
  };
}
