const STEPS = [1, 2, 5];
const DOUBLINGS = [1, 2, 4, 8];
/** How far beyond the cast a ring may stand, as a part of the length. */
const SLACK = 0.1;

/** Powers of ten times 1, 2 or 5, as exact as a double is: 10 ** -1 * 2 would be 0.2 only by luck. */
function roundLength(step: number, power: number): number {
  return Number(`${step}e${power}`);
}

/** The largest of 1, 2, 5 times a power of ten that is not above `most`. @param most finite, > 0 @throws RangeError */
export function roundLengthBelow(most: number): number {
  if (!Number.isFinite(most) || most <= 0) throw new RangeError("a length must be finite and above zero");
  return largestOf(STEPS, most);
}

function largestOf(steps: readonly number[], most: number): number {
  const power = Math.floor(Math.log10(most));
  const candidates = [power - 1, power, power + 1].flatMap((p) => steps.map((step) => roundLength(step, p)));
  return Math.max(...candidates.filter((length) => length <= most * (1 + 1e-12)));
}

/** Two to five evenly spaced round lengths up to `most`: rings of a linear scene. */
export function evenLengths(most: number): number[] {
  const step = roundLengthBelow(most / 2);
  const power = Math.floor(Math.log10(step) + 1e-9);
  const digit = Math.round(step / roundLength(1, power));
  const count = Math.floor((most / step) * (1 + 1e-12));
  // Put together from text, so that three times 0.1 is 0.3.
  return Array.from({ length: count }, (_, at) => roundLength((at + 1) * digit, power));
}

/**
 * Rings of a log scene, each the same number of times farther than the one inside it: powers of ten between the two
 * lengths where at least two fit, and three doublings up to the farther length where they do not.
 * @param least finite, > 0 @param most finite, >= least @throws RangeError
 */
export function stretchedLengths(least: number, most: number): { lengths: number[]; ratio: number } {
  if (!Number.isFinite(most) || !(least > 0) || most < least) throw new RangeError("lengths must be 0 < least <= most");
  const [from, to] = [least * (1 - SLACK), most * (1 + SLACK)];
  const first = Math.floor(Math.log10(from));
  const powers = Array.from({ length: Math.ceil(Math.log10(to)) - first + 1 }, (_, at) => roundLength(1, first + at));
  const tens = powers.filter((length) => length >= from && length <= to);
  if (tens.length >= 2) return { lengths: tens, ratio: 10 };
  const last = largestOf(DOUBLINGS, to);
  return { lengths: [last / 4, last / 2, last], ratio: 2 };
}
