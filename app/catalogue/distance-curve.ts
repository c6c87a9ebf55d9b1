import type { DistanceAnswer } from "#app/astrometry/distance.ts";
import type { Prior } from "#app/astrometry/posterior.ts";

export interface DistanceCurve {
  /** pc, evenly spaced. */
  at: number[];
  /** Each scaled to a highest point of 1. */
  likelihood: number[];
  prior: number[] | null;
  posterior: number[] | null;
}

const POINTS = 160;

function logPrior(prior: Prior, r: number): number {
  if (prior.name === "edsd") return 2 * Math.log(r) - r / prior.lengthPc;
  if (r > prior.limitPc) return Number.NEGATIVE_INFINITY;
  return prior.name === "uniform-density" ? 2 * Math.log(r) : 0;
}

/** exp of each, so that the largest becomes 1. */
function heights(logs: number[]): number[] {
  const top = Math.max(...logs);
  return logs.map((log) => Math.exp(log - top));
}

/**
 * Likelihood, prior and posterior over the distances that matter, for drawing only: figures come from the quadrature.
 * The likelihood is N(parallax; 1/r, error) as a function of r (Bailer-Jones 2015, PASP 127, 994).
 */
export function distanceCurve(answer: DistanceAnswer, prior: Prior | null): DistanceCurve | null {
  if (!answer.pc) return null;
  const { low90, high90, value } = answer.pc;
  const far = Number.isFinite(high90) ? high90 : value * 4;
  const from = Math.max(low90 - (value - low90), value * 1e-3);
  const to = far + (far - value);
  const at = Array.from({ length: POINTS }, (_, index) => from + ((to - from) * index) / (POINTS - 1));
  const logs = at.map((r) => -0.5 * ((answer.parallaxMas - 1000 / r) / answer.errorMas) ** 2);
  if (!prior) return { at, likelihood: heights(logs), prior: null, posterior: null };
  const priors = at.map((r) => logPrior(prior, r));
  return {
    at,
    likelihood: heights(logs),
    prior: heights(priors),
    posterior: heights(logs.map((log, index) => log + (priors[index] ?? 0))),
  };
}
