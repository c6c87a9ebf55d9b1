import { z } from "zod";

const note = z
  .string()
  .trim()
  .max(1000, "At most 1000 characters.")
  .default("")
  .transform((text) => text || null);

export const SignStep = z.object({
  exhibitId: z.string(),
  version: z.coerce.number().int().positive(),
  digest: z.string().regex(/^[0-9a-f]{64}$/, "Open the page again before you sign."),
  note,
});

export const ReturnStep = SignStep.omit({ digest: true, note: true }).extend({
  note: z.string().trim().min(1, "Say why, so that it can be put right.").max(1000, "At most 1000 characters."),
});

export const TakeBackStep = SignStep.omit({ digest: true });
