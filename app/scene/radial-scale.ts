/**
 * From a distance in parsec to a radius in the scene.
 * Linear: the radius is the distance. Log: asinh(d / core), which is linear near the Sun (the Sun stands at 0) and grows
 * as the logarithm far from it: each tenfold step in distance beyond the core takes the same room.
 */
export interface RadialScale {
  mapping: "linear" | "log";
  /** Where the log scale turns from linear to logarithmic, pc; 1 and without meaning for linear. */
  corePc: number;
}

/** @param distancePc finite, >= 0 @throws RangeError */
export function radiusOf({ mapping, corePc }: RadialScale, distancePc: number): number {
  if (!Number.isFinite(distancePc) || distancePc < 0)
    throw new RangeError("distancePc must be finite and not negative");
  return mapping === "linear" ? distancePc : Math.asinh(distancePc / corePc);
}

/** The inverse of radiusOf. @param radius finite, >= 0 @throws RangeError */
export function distanceAt({ mapping, corePc }: RadialScale, radius: number): number {
  if (!Number.isFinite(radius) || radius < 0) throw new RangeError("radius must be finite and not negative");
  return mapping === "linear" ? radius : Math.sinh(radius) * corePc;
}

/** A scale for a cast: the log core is a third of the nearest distance, so that every member stands beyond it. */
export function scaleFor(mapping: "linear" | "log", distancesPc: readonly number[]): RadialScale {
  const nearest = distancesPc.reduce((least, pc) => (pc > 0 && pc < least ? pc : least), Number.POSITIVE_INFINITY);
  return { mapping, corePc: mapping === "log" && Number.isFinite(nearest) ? nearest / 3 : 1 };
}
