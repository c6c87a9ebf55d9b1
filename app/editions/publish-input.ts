import { z } from "zod";

const note = z
  .string()
  .trim()
  .max(1000, "At most 1000 characters.")
  .default("")
  .transform((text) => text || null);

export const PublishEdition = z.object({
  exhibitId: z.string(),
  version: z.coerce.number().int().positive(),
  digest: z.string().regex(/^[0-9a-f]{64}$/, "Open the page again before you publish."),
  note,
});

export const ReissueEdition = z.object({
  exhibitId: z.string(),
  version: z.coerce.number().int().positive(),
  number: z.coerce.number().int().positive(),
  note: z.string().trim().min(1, "Say why this edition comes back.").max(1000, "At most 1000 characters."),
});
