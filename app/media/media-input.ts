import { z } from "zod";
import { LICENCES } from "#app/database/enums.ts";
import { optionalText } from "#app/input-fields.ts";

const needed = (most: number, message: string) =>
  z.string().trim().min(1, message).max(most, `At most ${most} characters.`);

const fields = {
  creator: needed(200, "Say who made it."),
  creditLine: needed(300, "Give the credit line that is shown with it."),
  licence: z.enum(LICENCES, "Choose the licence under which it may be shown."),
  altEn: needed(500, "Say what the picture shows, for those who do not see it."),
  altFr: optionalText(500),
};

export const UploadMedia = z.object(fields);
export const EditMedia = z.object({ mediaId: z.string(), version: z.coerce.number().int().positive(), ...fields });
