import { invertParallax, type Regime, regimeOf } from "./parallax.ts";
import { distancePosterior, type Prior } from "./posterior.ts";
import { PC_AU, PC_LY } from "./units.ts";

/** value with its 68 % (low, high) and 90 % (low90, high90) ranges, and the likeliest distance. */
export interface DistanceRange {
  value: number;
  low: number;
  high: number;
  low90: number;
  high90: number;
  mode: number;
}

export interface DistanceAnswer {
  parallaxMas: number;
  errorMas: number;
  /** error / parallax: negative for a negative parallax, Infinity for a parallax of zero. */
  fractionalError: number;
  regime: Regime;
  method: "inverse" | Prior["name"] | null;
  pc: DistanceRange | null;
  ly: DistanceRange | null;
  au: DistanceRange | null;
  /** Every peak of the posterior, pc, ascending; the value alone for "inverse"; empty when there is no answer. */
  modes: number[];
  /** The probability that each of `modes` stands for; sums to one. */
  modeShares: number[];
  /** Why there is no distance. */
  reason: string | null;
}

/** Quantiles survive a change of unit: they are transformed, no sigma is propagated. */
function scaled(range: DistanceRange, factor: number): DistanceRange {
  return {
    value: range.value * factor,
    low: range.low * factor,
    high: range.high * factor,
    low90: range.low90 * factor,
    high90: range.high90 * factor,
    mode: range.mode * factor,
  };
}

const inUnits = (pc: DistanceRange) => ({ pc, ly: scaled(pc, PC_LY), au: scaled(pc, PC_AU) });

function byInversion(parallaxMas: number, errorMas: number) {
  const { valuePc, lowPc, highPc, low90Pc, high90Pc } = invertParallax(parallaxMas, errorMas);
  const pc = { value: valuePc, low: lowPc, high: highPc, low90: low90Pc, high90: high90Pc, mode: valuePc };
  return { method: "inverse" as const, ...inUnits(pc), modes: [valuePc], modeShares: [1], reason: null };
}

function byPosterior(parallaxMas: number, errorMas: number, prior: Prior) {
  const found = distancePosterior({ parallaxMas, errorMas, prior });
  const pc = {
    value: found.q50Pc,
    low: found.q16Pc,
    high: found.q84Pc,
    low90: found.q05Pc,
    high90: found.q95Pc,
    mode: found.modePc,
  };
  return { method: prior.name, ...inUnits(pc), modes: found.modesPc, modeShares: found.modeShares, reason: null };
}

function unanswered(parallaxMas: number) {
  const cause = parallaxMas > 0 ? "The error is more than a fifth of the parallax" : "The parallax is not above zero";
  const reason = `${cause}, so one over the parallax says nothing of the distance: choose a named prior, with a reason.`;
  return { method: null, pc: null, ly: null, au: null, modes: [], modeShares: [], reason };
}

/**
 * The one decision of what may be said of a distance. With a prior: the posterior, whatever the regime (value = median,
 * 16th to 84th and 5th to 95th percentiles). Without: 1/p and its range in the firm and wide regimes, and nothing, with
 * the reason, where only a prior could lead.
 * @param input parallax (any sign) and its standard error, mas
 * @throws RangeError naming the parameter that is not finite, not above zero, or beyond 1e30
 */
export function distanceFromParallax(input: {
  parallaxMas: number;
  errorMas: number;
  prior?: Prior | null;
}): DistanceAnswer {
  const { parallaxMas, errorMas, prior } = input;
  const regime = regimeOf(parallaxMas, errorMas);
  const given = { parallaxMas, errorMas, fractionalError: errorMas / parallaxMas, regime };
  if (prior) return { ...given, ...byPosterior(parallaxMas, errorMas, prior) };
  if (regime === "prior-led") return { ...given, ...unanswered(parallaxMas) };
  return { ...given, ...byInversion(parallaxMas, errorMas) };
}
