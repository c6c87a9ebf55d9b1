const STEPS = [1, 2, 5];

/** Powers of ten times 1, 2 or 5, as exact as a double is: 10 ** -1 * 2 would be 0.2 only by luck. */
function roundLength(step: number, power: number): number {
  return Number(`${step}e${power}`);
}

/** The largest of 1, 2, 5 times a power of ten that is not above `most`. @param most finite, > 0 @throws RangeError */
export function roundLengthBelow(most: number): number {
  if (!Number.isFinite(most) || most <= 0) throw new RangeError("a length must be finite and above zero");
  const power = Math.floor(Math.log10(most));
  const candidates = [power - 1, power, power + 1].flatMap((p) => STEPS.map((step) => roundLength(step, p)));
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

/** Powers of ten (and halves of them where few fit) between two lengths: rings of a log scene. */
export function decadeLengths(least: number, most: number): number[] {
  const decades: number[] = [];
  for (let power = Math.floor(Math.log10(least)); power <= Math.ceil(Math.log10(most)); power += 1) {
    for (const step of [1, 2, 5]) decades.push(roundLength(step, power));
  }
  const inside = decades.filter((length) => length >= least * 0.9 && length <= most * 1.1);
  const tens = inside.filter((length) => Number.isInteger(Math.log10(length)));
  return tens.length >= 2 ? tens : inside.slice(0, 5);
}
