import type { Regime } from "#app/astrometry/parallax.ts";
import type { MeasurementState, RecordKind } from "#app/database/enums.ts";
import type { StateTone } from "#app/ui/StateMark.tsx";

export const KIND_WORDS: Record<RecordKind, string> = {
  star: "star",
  "star-cluster": "star cluster",
  galaxy: "galaxy",
  "solar-system-body": "solar-system body",
  other: "other",
};

export const REGIME_WORDS: Record<Regime, string> = {
  firm: "firm",
  wide: "wide: a range only",
  "prior-led": "prior-led",
};

export const MEASUREMENT_STATE: Record<MeasurementState, { word: string; tone: StateTone }> = {
  proposed: { word: "proposed", tone: "none" },
  vetted: { word: "vetted", tone: "vetted" },
  rejected: { word: "rejected", tone: "none" },
  superseded: { word: "superseded", tone: "none" },
};

export const PRIOR_WORDS: Record<string, string> = {
  none: "None: 1/p where it may be used",
  edsd: "Exponentially decreasing space density",
  "uniform-density": "Uniform space density up to a limit",
  "uniform-distance": "Uniform distance up to a limit",
};
