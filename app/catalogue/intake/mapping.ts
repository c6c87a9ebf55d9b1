import { z } from "zod";
import { type FieldErrors, Invalid } from "#app/errors.ts";
import { optionalText } from "#app/input-fields.ts";
import { parseInput } from "#app/parse-input.ts";
import { knownUnit, QUANTITY_FACTS } from "../quantities.ts";
import { type ColumnUse, MEANINGS, quantityOf } from "./meanings.ts";
import type { TableColumn } from "./table.ts";

const epoch = optionalText(12).refine((value) => value === null || /^J?\d{4}(\.\d+)?$/.test(value), {
  error: "A Julian year, such as 2015.0.",
});

const Options = z.object({
  sourceId: optionalText(26),
  locator: optionalText(120),
  epoch: epoch.transform((value) => value?.replace(/^J/, "") ?? null),
  /** What rows without a name or identifier are called: this and the row's number. */
  namePrefix: optionalText(80),
  adopt: z
    .string()
    .optional()
    .transform((ticked) => ticked !== undefined),
  adoptReason: optionalText(1000),
});

export type IntakeOptions = z.output<typeof Options>;

/** What a person made of a file: each column's use, and what holds for all rows. Kept with the intake. */
export interface Mapping {
  columns: ColumnUse[];
  options: IntakeOptions;
}

/** Reads the mapping's form: `meaning-0`, `unit-0`, `catalogue-0`... @throws Invalid at each field that is wrong */
export function mappingFromForm(form: FormData, columns: TableColumn[]): Mapping {
  const fields: FieldErrors = {};
  const value = (name: string) => String(form.get(name) ?? "").trim();
  const seen = new Map<string, string>();
  const uses = columns.map((column, at): ColumnUse => {
    const meaning = MEANINGS.find((one) => one === value(`meaning-${at}`)) ?? "ignore";
    const quantity = quantityOf(meaning);
    const unit = quantity ? knownUnit(quantity, value(`unit-${at}`) || QUANTITY_FACTS[quantity].canonical) : null;
    if (quantity && !unit) {
      const known = Object.keys(QUANTITY_FACTS[quantity].units).join(", ");
      fields[`unit-${at}`] = [`“${value(`unit-${at}`)}” is no unit of ${quantity}: ${known}.`];
    }
    const catalogue = meaning === "identifier" ? value(`catalogue-${at}`) || null : null;
    if (meaning === "identifier" && !catalogue)
      fields[`catalogue-${at}`] = ["Say whose identifier it is, such as HIP."];
    const key = meaning === "identifier" ? `identifier ${catalogue}` : meaning;
    if (meaning !== "ignore" && seen.has(key)) {
      fields[`meaning-${at}`] = [`${seen.get(key)} means this already.`];
    }
    seen.set(key, column.name);
    return { meaning, unit, catalogue };
  });
  const options = parseInput(Options, form);
  Object.assign(fields, missingOptions(uses, options));
  if (Object.keys(fields).length > 0) throw new Invalid(fields);
  return { columns: uses, options };
}

function missingOptions(uses: ColumnUse[], options: IntakeOptions): FieldErrors {
  const has = (meaning: string) => uses.some((use) => use.meaning === meaning);
  const fields: FieldErrors = {};
  if (!uses.some((use) => quantityOf(use.meaning)) && !has("ra")) {
    fields[""] = ["No column means a measurement or a position, so there is nothing to take in."];
  }
  if (has("ra") !== has("dec")) fields[""] = ["A position is both: right ascension and declination."];
  if (!has("name") && !options.namePrefix) {
    fields.namePrefix = ["No column holds names: say what the rows are called, and their number is added."];
  }
  if (!options.sourceId) fields.sourceId = ["Choose the source of this table."];
  if (!options.epoch) fields.epoch = ["Give the epoch of the table."];
  if (options.adopt && !options.adoptReason) fields.adoptReason = ["Say why these parallaxes count."];
  return fields;
}
