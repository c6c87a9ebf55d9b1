import { z } from "zod";

/** Where the visitor stands at the start. Angles in degrees; distance 1 just fits the cast. */
export const Camera = z.strictObject({
  /** Around the Galactic pole, 0 looking along -X. */
  azimuthDeg: z.coerce.number().min(-360).max(360).default(-60),
  /** Above the Galactic plane. */
  elevationDeg: z.coerce.number().min(-89, "At least -89 degrees.").max(89, "At most 89 degrees.").default(24),
  distance: z.coerce.number().min(0.2, "At least 0.2.").max(10, "At most 10.").default(1),
  fovDeg: z.coerce.number().min(10).max(90).default(40),
});

/**
 * The scene document: how a cast is shown, not who is in it. One kind so far, `volume`: records around the Sun in Galactic
 * coordinates. Unknown keys are refused, so that a document never means more than what is checked here.
 */
export const SceneDocument = z.strictObject({
  version: z.literal(1).default(1),
  kind: z.literal("volume"),
  /** linear: to scale. log: distances drawn together so that near and far fit; never "to scale". */
  mapping: z.enum(["linear", "log"]).default("linear"),
  unit: z.enum(["ly", "pc"]).default("ly"),
  rings: z.enum(["auto", "none"]).default("auto"),
  errorBars: z.boolean().default(true),
  labels: z.boolean().default(true),
  camera: Camera.prefault({}),
});

export type SceneDocument = z.infer<typeof SceneDocument>;
export type SceneCamera = z.infer<typeof Camera>;
