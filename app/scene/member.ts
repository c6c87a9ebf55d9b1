import type { Regime } from "#app/astrometry/parallax.ts";
import type { RangeNumbers } from "#app/figures/range-figure.ts";

/** One of the cast, ready to be placed. */
export interface SceneMember {
  recordId: string;
  name: string;
  /** ICRS, degrees. */
  raDeg: number;
  decDeg: number;
  /** 68 % range, pc, 0 <= low < value < high, finite. */
  distancePc: RangeNumbers;
  regime: Regime;
  /** Colour index B-V and magnitude V, mag; null where nothing is kept. */
  bv: number | null;
  vMag: number | null;
  /** Whether its name stands in the picture. */
  labelled: boolean;
}

/** One of the cast as it is kept: without a position or a distance it cannot be placed. */
export interface CastMember extends Omit<SceneMember, "raDeg" | "decDeg" | "distancePc" | "regime"> {
  raDeg: number | null;
  decDeg: number | null;
  distancePc: RangeNumbers | null;
  regime: Regime | null;
}
