import { z } from "zod";
import { LANGUAGES } from "#app/database/enums.ts";
import { slug } from "#app/exhibits/exhibit-input.ts";

const fields = {
  name: z.string().trim().min(1, "Give it a name.").max(120, "At most 120 characters."),
  station: z.string().trim().min(1, "Say where it stands.").max(160, "At most 160 characters."),
  language: z.enum(LANGUAGES),
  idleSeconds: z.coerce
    .number("A whole number of seconds.")
    .int("A whole number of seconds.")
    .min(20, "At least 20 seconds, so that a slow reader is not interrupted.")
    .max(900, "At most 900 seconds."),
};

export const CreateKiosk = z.object({ slug, ...fields });

export const EditKiosk = z.object({
  kioskId: z.string(),
  version: z.coerce.number().int().positive(),
  ...fields,
});

export const AssignKiosk = z.object({
  kioskId: z.string(),
  version: z.coerce.number().int().positive(),
  /** "" takes the exhibit off: the kiosk shows that it rests. */
  exhibitId: z.string().transform((text) => text || null),
});
