import type { Regime } from "#app/astrometry/parallax.ts";
import type { RangeNumbers } from "#app/figures/range-figure.ts";

/** One of the cast, ready to be placed. */
export interface SceneMember {
  recordId: string;
  name: string;
  /** ICRS, degrees. */
  raDeg: number;
  decDeg: number;
  /** 68 % range, pc; high may be Infinity. */
  distancePc: RangeNumbers;
  regime: Regime;
  /** Colour index B-V and magnitude V, mag; null where nothing is kept. */
  bv: number | null;
  vMag: number | null;
  /** Whether its name stands in the picture. */
  labelled: boolean;
}
