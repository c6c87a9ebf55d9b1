import { z } from "zod";
import { optionalText, seenVersion } from "#app/input-fields.ts";

const note = optionalText(1000);

export const SignStep = z.object({
  exhibitId: z.string(),
  version: seenVersion,
  digest: z.string().regex(/^[0-9a-f]{64}$/, "Open the page again before you sign."),
  note,
});

export const ReturnStep = SignStep.omit({ digest: true, note: true }).extend({
  note: z.string().trim().min(1, "Say why, so that it can be put right.").max(1000, "At most 1000 characters."),
});

export const TakeBackStep = SignStep.omit({ digest: true });
