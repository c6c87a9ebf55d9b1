import { requireBounded, requirePositive } from "./bounds.ts";

/** firm: value with its range; wide: a range only; prior-led: nothing from 1/p. */
export type Regime = "firm" | "wide" | "prior-led";

export interface InverseDistance {
  valuePc: number;
  lowPc: number;
  highPc: number;
  low90Pc: number;
  high90Pc: number;
}

/** Largest error/parallax at which a value may be shown; the house's choice, inside the limit below. */
const FIRM_LIMIT = 0.1;
/** Largest error/parallax at which 1/p does little harm: Bailer-Jones 2015 (PASP 127, 994). */
const WIDE_LIMIT = 0.2;
/** 0.70 +- 0.07 stands on the limit as written; as doubles its ratio lies two roundings above it. */
const ON_THE_LIMIT = 1 + 2 * Number.EPSILON;
/** The 95th percentile of the normal distribution, in standard deviations. */
const NORMAL_95 = 1.6448536269514722;

/**
 * How much may be said from a parallax.
 * @param parallaxMas any sign, mas
 * @param errorMas standard error, mas, above zero
 * @throws RangeError naming the parameter that is not finite, not above zero, or beyond 1e30
 */
export function regimeOf(parallaxMas: number, errorMas: number): Regime {
  requireBounded("parallaxMas", parallaxMas);
  requirePositive("errorMas", errorMas);
  if (parallaxMas <= 0) return "prior-led";
  const fractionalError = errorMas / parallaxMas;
  if (fractionalError <= FIRM_LIMIT * ON_THE_LIMIT) return "firm";
  return fractionalError <= WIDE_LIMIT * ON_THE_LIMIT ? "wide" : "prior-led";
}

const inverse = (parallaxMas: number) => (parallaxMas > 0 ? 1000 / parallaxMas : Number.POSITIVE_INFINITY);

/**
 * Distance by inversion, 1/p, with [1/(p+s), 1/(p-s)] and the same at the 5th and 95th percentiles of the parallax.
 * Neither unbiased nor symmetric (Lutz & Kelker 1973, PASP 85, 573; Luri et al. 2018, A&A 616, A9): fit to be shown
 * only in the firm and wide regimes. A far end is Infinity where the parallax less its error is not above zero.
 * @param parallaxMas above zero, mas
 * @param errorMas standard error, mas, above zero
 * @throws RangeError naming the parameter that is not finite, not above zero, or beyond 1e30
 */
export function invertParallax(parallaxMas: number, errorMas: number): InverseDistance {
  requirePositive("parallaxMas", parallaxMas);
  requirePositive("errorMas", errorMas);
  return {
    valuePc: inverse(parallaxMas),
    lowPc: inverse(parallaxMas + errorMas),
    highPc: inverse(parallaxMas - errorMas),
    low90Pc: inverse(parallaxMas + NORMAL_95 * errorMas),
    high90Pc: inverse(parallaxMas - NORMAL_95 * errorMas),
  };
}
