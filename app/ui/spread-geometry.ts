/** What a spread bar draws, in percent of its width on a logarithmic axis. */
export interface SpreadGeometry {
  /** Null when there is no single value to show, or it lies outside the axis. */
  value: number | null;
  band68: Band | null;
  band90: Band | null;
}

export interface Band {
  start: number;
  width: number;
  /** The band goes on beyond the axis on this side (also: it has no end). */
  openStart: boolean;
  openEnd: boolean;
}

export interface Spread {
  value?: number | null;
  low: number;
  high: number;
  low90?: number | null;
  high90?: number | null;
}

/** Ends of the axis, both above zero, in the same unit as the spread. */
export type Domain = readonly [min: number, max: number];

/**
 * Places a value and its 68 % and 90 % ranges on a log axis.
 * Ends outside the axis are cut and marked open; an end of Infinity, or one at or below zero, is open too.
 * Throws RangeError for an axis that is not 0 < min < max and for a range whose low is above its high.
 */
export function spreadGeometry(spread: Spread, domain: Domain): SpreadGeometry {
  const place = logPlace(domain);
  const value = spread.value ?? null;
  const at = value === null || value <= 0 ? null : place(value);
  return {
    value: at === null || at < 0 || at > 100 ? null : at,
    band68: band(spread.low, spread.high, place),
    band90: spread.low90 == null || spread.high90 == null ? null : band(spread.low90, spread.high90, place),
  };
}

/** The place of a number on the axis, in percent; below 0 and above 100 when it lies outside. */
export function logPlace([min, max]: Domain): (value: number) => number {
  if (!(min > 0 && max > min && Number.isFinite(max))) throw new RangeError(`Not a log axis: ${min} to ${max}`);
  const span = Math.log(max / min);
  return (value) => (value > 0 ? rounded((100 * Math.log(value / min)) / span) : Number.NEGATIVE_INFINITY);
}

/** To a thousandth of a percent: engines differ in the last bit of a logarithm, and server and browser must agree. */
function rounded(percent: number): number {
  return Math.round(percent * 1000) / 1000;
}

function band(low: number, high: number, place: (value: number) => number): Band | null {
  if (!(low <= high)) throw new RangeError(`Not a range: ${low} to ${high}`);
  const from = place(low);
  const to = place(high);
  if (to < 0 || from > 100) return null;
  const start = Math.max(0, from);
  return { start, width: rounded(Math.min(100, to) - start), openStart: from < 0, openEnd: to > 100 };
}

/**
 * An axis on which all the given spreads fit, with `margin` times their logarithmic extent free on either side.
 * Ends that are infinite or not above zero are left out; throws RangeError when nothing is left.
 */
export function fitDomain(spreads: readonly Spread[], margin = 0.5): Domain {
  const ends = spreads
    .flatMap((spread) => [spread.value, spread.low, spread.high, spread.low90, spread.high90])
    .filter((end): end is number => typeof end === "number" && Number.isFinite(end) && end > 0);
  if (ends.length === 0) throw new RangeError("No spread has an end above zero");
  const min = Math.min(...ends);
  const max = Math.max(...ends);
  // A single point still needs an axis with a length: one percent either way.
  const free = max > min ? margin * Math.log(max / min) : 0.01;
  return [min * Math.exp(-free), max * Math.exp(free)];
}
