import type { SceneMember } from "./member.ts";

/** Neighbours in distance whose ranges overlap: which of the two is nearer is not known. */
export function uncertainOrder(members: SceneMember[]): [string, string][] {
  const ordered = [...members].sort((a, b) => a.distancePc.value - b.distancePc.value);
  const pairs: [string, string][] = [];
  for (const [at, near] of ordered.entries()) {
    const far = ordered[at + 1];
    if (far && near.distancePc.high > far.distancePc.low) pairs.push([near.name, far.name]);
  }
  return pairs;
}
