import type { SceneMember } from "./member.ts";

const byValue = (a: SceneMember, b: SceneMember) => a.distancePc.value - b.distancePc.value;

/**
 * Every pair whose 68 % ranges overlap: which of the two is nearer is not known. Names, the one with the smaller value
 * first; pairs in the order of distance.
 */
export function uncertainOrder(members: readonly SceneMember[]): [string, string][] {
  const byLow = [...members].sort((a, b) => a.distancePc.low - b.distancePc.low);
  const pairs: [SceneMember, SceneMember][] = [];
  for (const [at, one] of byLow.entries()) {
    for (let later = at + 1; later < byLow.length; later += 1) {
      const other = byLow[later];
      // In the order of near ends nobody after this one can overlap either.
      if (!other || other.distancePc.low >= one.distancePc.high) break;
      pairs.push(byValue(one, other) <= 0 ? [one, other] : [other, one]);
    }
  }
  return pairs.sort((a, b) => byValue(a[0], b[0]) || byValue(a[1], b[1])).map(([near, far]) => [near.name, far.name]);
}
