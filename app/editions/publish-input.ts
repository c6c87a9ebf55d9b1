import { z } from "zod";
import { optionalText, seenVersion } from "#app/input-fields.ts";

const note = optionalText(1000);

export const PublishEdition = z.object({
  exhibitId: z.string(),
  version: seenVersion,
  digest: z.string().regex(/^[0-9a-f]{64}$/, "Open the page again before you publish."),
  note,
});

export const ReissueEdition = z.object({
  exhibitId: z.string(),
  version: seenVersion,
  number: z.coerce.number().int().positive(),
  note: z.string().trim().min(1, "Say why this edition comes back.").max(1000, "At most 1000 characters."),
});
