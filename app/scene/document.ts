import { z } from "zod";

/** A form sends numbers as text. What is empty, or no number at all, is refused at its field, not taken for zero. */
const asNumber = (value: unknown) => (typeof value === "string" && value.trim() !== "" ? Number(value) : value);
const numberBetween = (least: number, most: number) => {
  const within = z.number("Enter a number.").min(least, `At least ${least}.`).max(most, `At most ${most}.`);
  return z.preprocess(asNumber, within);
};

/** Where the visitor stands at the start. Angles in degrees; distance 1 just fits the cast. */
export const Camera = z.strictObject({
  /** Around the Galactic pole, 0 looking along -X. */
  azimuthDeg: numberBetween(-360, 360).default(-60),
  /** Above the Galactic plane. */
  elevationDeg: numberBetween(-89, 89).default(24),
  distance: numberBetween(0.2, 10).default(1),
  fovDeg: numberBetween(10, 90).default(40),
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
