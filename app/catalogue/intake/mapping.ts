import { z } from "zod";
import { type FieldErrors, Invalid } from "#app/errors.ts";
import { julianEpoch, optionalText } from "#app/input-fields.ts";
import { parseInput } from "#app/parse-input.ts";
import { knownUnit, QUANTITY_FACTS } from "../quantities.ts";
import { type ColumnUse, isPositionUnit, MEANINGS, quantityOf } from "./meanings.ts";
import type { TableColumn } from "./table.ts";

const Options = z.object({
  sourceId: optionalText(26),
  locator: optionalText(120),
  epoch: julianEpoch,
  /** Of the positions, where it is another one. */
  positionEpoch: julianEpoch,
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
  const uses = columns.map((column, at) => useFromForm(form, column, at, fields));
  refuseTwice(uses, columns, fields);
  refuseOtherErrorUnit(uses, fields);
  const options = parseInput(Options, form);
  Object.assign(fields, missingOptions(uses, options));
  if (Object.keys(fields).length > 0) throw new Invalid(fields);
  return { columns: uses, options };
}

function useFromForm(form: FormData, column: TableColumn, at: number, fields: FieldErrors): ColumnUse {
  const value = (name: string) => String(form.get(`${name}-${at}`) ?? "").trim();
  const meaning = MEANINGS.find((one) => one === value("meaning")) ?? "ignore";
  const quantity = quantityOf(meaning);
  const catalogue = meaning === "identifier" ? value("catalogue") || null : null;
  if (meaning === "identifier" && !catalogue) fields[`catalogue-${at}`] = ["Say whose identifier it is, such as HIP."];
  if ((meaning === "ra" || meaning === "dec") && !isPositionUnit(column.unit)) {
    fields[`meaning-${at}`] = [
      `The file gives it in ${column.unit}. Positions are read in degrees, or as parts of 60.`,
    ];
  }
  if (!quantity) return { meaning, unit: null, catalogue };
  // What the file says counts before what is usual, so that an unknown unit is never passed over.
  const said = value("unit") || column.unit || QUANTITY_FACTS[quantity].canonical;
  const unit = knownUnit(quantity, said);
  if (!unit) {
    const { label, units } = QUANTITY_FACTS[quantity];
    fields[`unit-${at}`] = [
      `“${said}” is no unit of ${label.charAt(0).toLowerCase()}${label.slice(1)}: ${Object.keys(units).join(", ")}.`,
    ];
  }
  return { meaning, unit, catalogue };
}

function refuseTwice(uses: ColumnUse[], columns: TableColumn[], fields: FieldErrors): void {
  const seen = new Map<string, string>();
  for (const [at, { meaning, catalogue }] of uses.entries()) {
    const key = meaning === "identifier" ? `identifier ${catalogue}` : meaning;
    if (meaning !== "ignore" && seen.has(key)) fields[`meaning-${at}`] = [`${seen.get(key)} means this already.`];
    seen.set(key, columns[at]?.name ?? "");
  }
}

/** A measurement keeps one unit for its value and its error. */
function refuseOtherErrorUnit(uses: ColumnUse[], fields: FieldErrors): void {
  for (const [at, { meaning, unit }] of uses.entries()) {
    const value = uses.find((use) => `${use.meaning}-error` === meaning);
    if (meaning.endsWith("-error") && !value) {
      fields[`meaning-${at}`] ??= ["No column holds the values that these errors belong to."];
    }
    if (value?.unit && unit && value.unit !== unit) {
      fields[`unit-${at}`] = [`The values are in ${value.unit}: bring values and errors into one unit first.`];
    }
  }
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
