import { parseDeclination, parseRightAscension } from "#app/astrometry/coordinates.ts";
import type { Quantity } from "#app/database/enums.ts";
import { QUANTITIES } from "#app/database/enums.ts";
import { measuredNumberText } from "../printed-value.ts";
import { type Identifier, parseIdentifier } from "../record-input.ts";
import type { Mapping } from "./mapping.ts";
import type { ColumnUse } from "./meanings.ts";
import type { TableColumn, TableRow } from "./table.ts";

export interface Problem {
  row: number;
  column: string;
  value: string;
  reason: string;
}

export interface PlannedMeasurement {
  quantity: Quantity;
  rawText: string;
  value: string;
  error: string | null;
  unit: string;
  column: string;
}

export interface PlannedRow {
  row: number;
  name: string;
  identifiers: Identifier[];
  position: { raText: string; decText: string; raDeg: number; decDeg: number } | null;
  measurements: PlannedMeasurement[];
  problems: Problem[];
  /** Nothing that keeps the row out, but a person should know. */
  warnings: Problem[];
}

/** What a cell says when it says nothing. */
const BLANK = /^(|null|nan|--+|n\/a|\\N)$/i;

/** Understands one row, and says of every cell that cannot be understood why. */
export function planRow(row: TableRow, columns: TableColumn[], mapping: Mapping): PlannedRow {
  const problems: Problem[] = [];
  const warnings: Problem[] = [];
  const { number, cells } = row;
  if (cells.length !== columns.length) {
    const reason = `The row has ${cells.length} cells, the head ${columns.length} columns.`;
    problems.push({ row: number, column: "", value: cells.join(", ").slice(0, 80), reason });
    return { row: number, name: "", identifiers: [], position: null, measurements: [], problems, warnings: [] };
  }
  const cell = (at: number) => {
    const text = cells[at]?.trim() ?? "";
    return BLANK.test(text) ? "" : text;
  };
  const told = (at: number, reason: string): Problem => ({
    row: number,
    column: columns[at]?.name ?? "",
    value: (cells[at] ?? "").slice(0, 80),
    reason,
  });
  const say = (at: number, reason: string) => void problems.push(told(at, reason));
  const warn = (at: number, reason: string) => void warnings.push(told(at, reason));
  const where = (meaning: ColumnUse["meaning"]) => mapping.columns.findIndex((use) => use.meaning === meaning);
  const reader = { cell, say, warn, where, columns, mapping };
  const planned = {
    row: number,
    name: readName(reader, number),
    identifiers: readIdentifiers(reader),
    position: readPosition(reader),
    measurements: QUANTITIES.flatMap((quantity) => readMeasurement(reader, quantity)),
    problems,
    warnings,
  };
  if (problems.length === 0 && !planned.position && planned.measurements.length === 0) {
    const reason = "Neither a position nor a measurement stands in this row.";
    problems.push({ row: number, column: "", value: cells.join(", ").slice(0, 80), reason });
  }
  return planned;
}

interface Reader {
  cell: (at: number) => string;
  say: (at: number, reason: string) => void;
  warn: (at: number, reason: string) => void;
  where: (meaning: ColumnUse["meaning"]) => number;
  columns: TableColumn[];
  mapping: Mapping;
}

function readName({ cell, where, say, mapping }: Reader, number: number): string {
  const at = where("name");
  const name = at < 0 ? "" : cell(at);
  if (name.length > 120) say(at, "A name of more than 120 characters.");
  if (name) return name.slice(0, 120);
  if (mapping.options.namePrefix) return `${mapping.options.namePrefix} ${number}`;
  say(at, "The name is missing.");
  return "";
}

function readIdentifiers({ cell, say, mapping }: Reader): Identifier[] {
  return mapping.columns.flatMap((use, at) => {
    if (use.meaning !== "identifier" || cell(at) === "") return [];
    const text = cell(at);
    const parsed = parseIdentifier(text) ?? parseIdentifier(`${use.catalogue} ${text}`);
    if (parsed) return [parsed];
    say(at, `This is no identifier of ${use.catalogue}.`);
    return [];
  });
}

function readPosition({ cell, say, where }: Reader): PlannedRow["position"] {
  const [ra, dec] = [where("ra"), where("dec")];
  if (ra < 0 || dec < 0 || (cell(ra) === "" && cell(dec) === "")) return null;
  const read = (at: number, parse: (text: string) => number) => {
    try {
      return parse(cell(at));
    } catch (problem) {
      say(at, problem instanceof Error ? problem.message : "Not an angle.");
      return null;
    }
  };
  const raDeg = read(ra, parseRightAscension);
  const decDeg = read(dec, parseDeclination);
  if (raDeg === null || decDeg === null) return null;
  return { raText: cell(ra).slice(0, 40), decText: cell(dec).slice(0, 40), raDeg, decDeg };
}

function readMeasurement(reader: Reader, quantity: Quantity): PlannedMeasurement[] {
  const { cell, say, warn, where, columns, mapping } = reader;
  const [at, errorAt] = [where(quantity), where(`${quantity}-error`)];
  if (at < 0) return [];
  const hasError = errorAt >= 0 && cell(errorAt) !== "";
  if (cell(at) === "") {
    if (hasError) say(errorAt, "There is an error, but no value that it belongs to.");
    return [];
  }
  const value = readNumber(reader, at);
  const error = hasError ? readNumber(reader, errorAt) : null;
  if (error !== null && Number(error) <= 0) say(errorAt, "An error is above zero.");
  // Half of it would say more than the source does.
  if (value === null || (hasError && (error === null || Number(error) <= 0))) return [];
  if (quantity === "parallax" && error === null) {
    warn(errorAt < 0 ? at : errorAt, "A parallax without an error is kept, but cannot be adopted: no range follows.");
  }
  const unit = mapping.columns[at]?.unit ?? "";
  const rawText = error === null ? cell(at) : `${cell(at)} ± ${cell(errorAt)}`;
  return [{ quantity, rawText: rawText.slice(0, 200), value, error, unit, column: columns[at]?.name ?? "" }];
}

function readNumber({ cell, say }: Reader, at: number): string | null {
  try {
    return measuredNumberText(cell(at));
  } catch (problem) {
    say(at, problem instanceof Error ? problem.message : "Not a number.");
    return null;
  }
}
