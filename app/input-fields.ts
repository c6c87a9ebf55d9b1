import { z } from "zod";

/** Form fields that mean the same in every room. */

/** Text that may be left empty; empty is null. */
export const optionalText = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `At most ${most} characters.`)
    .default("")
    .transform((text) => text || null);

/** A Julian epoch, "1991.25" or "J1991.25", kept as its digits; empty is null. */
export const julianEpoch = z
  .string()
  .trim()
  .default("")
  .transform((text) => text.replace(/^J/i, ""))
  .refine((text) => text === "" || (/^\d{4}(\.\d+)?$/.test(text) && Number(text) >= 1700 && Number(text) <= 2100), {
    error: "A Julian year between 1700 and 2100, such as 1991.25.",
  })
  .transform((text) => text || null);

/** The version of a row that the person has seen. */
export const seenVersion = z.coerce.number().int().positive();
