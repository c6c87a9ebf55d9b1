import { type DistanceAnswer, distanceFromParallax } from "#app/astrometry/distance.ts";
import type { Prior } from "#app/astrometry/posterior.ts";
import type { PriorName } from "#app/database/enums.ts";
import { toCanonical } from "./quantities.ts";

export interface AdoptedParallax {
  value: string;
  error: string | null;
  unit: string;
}

/** The prior as astrometry wants it; null where none is chosen. */
export function priorOf(name: PriorName | null, scalePc: number | null): Prior | null {
  if (!name || scalePc === null) return null;
  return name === "edsd" ? { name, lengthPc: scalePc } : { name, limitPc: scalePc };
}

/**
 * The distance that follows from an adopted parallax: always worked out anew from its decimal text, so that it is the same
 * wherever it is asked for. null without a parallax that has an error.
 */
export function distanceOf(parallax: AdoptedParallax | null, prior: Prior | null): DistanceAnswer | null {
  if (!parallax || parallax.error === null) return null;
  return distanceFromParallax({
    parallaxMas: toCanonical("parallax", parallax.value, parallax.unit),
    errorMas: toCanonical("parallax", parallax.error, parallax.unit),
    prior,
  });
}
