import { type Domain, fitDomain, type Spread } from "#app/ui/spread-geometry.ts";

/** One axis for bars that are compared; undefined where there is no bar to draw. */
export function commonDomain(spreads: readonly Spread[], margin: number): Domain | undefined {
  return spreads.length > 0 ? fitDomain(spreads, margin) : undefined;
}
