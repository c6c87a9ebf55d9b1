import { z } from "zod";
import { QUANTITIES } from "#app/database/enums.ts";
import { julianEpoch, optionalText } from "#app/input-fields.ts";
import { measuredNumberText, parsePrinted } from "./printed-value.ts";
import { knownUnit, QUANTITY_FACTS } from "./quantities.ts";

/** A measurement as a person enters it: the printed text, and what it means. */
export const AddMeasurement = z
  .object({
    recordId: z.string(),
    quantity: z.enum(QUANTITIES),
    /** "130.23" or "130.23 ± 0.36", word for word. */
    printed: z.string().trim().min(1, "Enter what the source prints.").max(100, "At most 100 characters."),
    error: z.string().trim().max(40, "At most 40 characters.").default(""),
    unit: z.string().trim().min(1, "Choose a unit."),
    epoch: julianEpoch,
    sourceId: z
      .string()
      .default("")
      .transform((text) => text || null),
    locator: optionalText(200),
    note: optionalText(1000),
    fromMemory: z
      .string()
      .optional()
      .transform((ticked) => ticked !== undefined && ticked !== "no"),
  })
  .transform((input, context) => {
    const say = (field: string, message: string) => {
      context.addIssue({ code: "custom", path: [field], message });
    };
    const unit = knownUnit(input.quantity, input.unit);
    const { label, units } = QUANTITY_FACTS[input.quantity];
    if (!unit) say("unit", `“${input.unit}” is no unit of ${label.toLowerCase()}: ${Object.keys(units).join(", ")}.`);
    const parsed = attempt(
      () => parsePrinted(input.printed),
      (message) => say("printed", message),
    );
    const apart = input.error
      ? attempt(
          () => measuredNumberText(input.error),
          (message) => say("error", message),
        )
      : null;
    if (parsed?.error && apart)
      say("error", "The error stands in the printed text already. Leave one of the two empty.");
    const error = parsed?.error ?? apart;
    if (error && Number(error) <= 0) say(parsed?.error ? "printed" : "error", "An error is above zero.");
    if (!parsed || !unit) return z.NEVER;
    const { printed, error: typed, ...rest } = input;
    const rawText = typed ? `${printed} ± ${typed}` : printed;
    return { ...rest, unit, rawText, value: parsed.value, error: error ?? null };
  });

export type NewMeasurement = z.output<typeof AddMeasurement>;

function attempt<T>(read: () => T, say: (message: string) => void): T | null {
  try {
    return read();
  } catch (problem) {
    say(problem instanceof Error ? problem.message : String(problem));
    return null;
  }
}

const version = z.coerce.number().int().positive();
const reason = z.string().trim().min(1, "Say why.").max(1000, "At most 1000 characters.");

export const RejectMeasurement = z.object({ measurementId: z.string(), version, reason });
export const ConfirmMeasurement = z.object({ measurementId: z.string(), version, reason });
