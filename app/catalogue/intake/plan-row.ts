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
}

/** What a cell says when it says nothing. */
const BLANK = /^(|null|nan|--+|n\/a|\\N)$/i;

/** Understands one row, and says of every cell that cannot be understood why. */
export function planRow(row: TableRow, columns: TableColumn[], mapping: Mapping): PlannedRow {
  const problems: Problem[] = [];
  const { number, cells } = row;
  if (cells.length !== columns.length) {
    const reason = `The row has ${cells.length} cells, the head ${columns.length} columns.`;
    problems.push({ row: number, column: "", value: cells.join(", ").slice(0, 80), reason });
    return { row: number, name: "", identifiers: [], position: null, measurements: [], problems };
  }
  const cell = (at: number) => {
    const text = cells[at]?.trim() ?? "";
    return BLANK.test(text) ? "" : text;
  };
  const say = (at: number, reason: string) =>
    void problems.push({ row: number, column: columns[at]?.name ?? "", value: (cells[at] ?? "").slice(0, 80), reason });
  const where = (meaning: ColumnUse["meaning"]) => mapping.columns.findIndex((use) => use.meaning === meaning);
  const reader = { cell, say, where, columns, mapping };
  return {
    row: number,
    name: readName(reader, number),
    identifiers: readIdentifiers(reader),
    position: readPosition(reader),
    measurements: QUANTITIES.flatMap((quantity) => readMeasurement(reader, quantity)),
    problems,
  };
}

interface Reader {
  cell: (at: number) => string;
  say: (at: number, reason: string) => void;
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
  const { cell, say, where, columns, mapping } = reader;
  const at = where(quantity);
  if (at < 0 || cell(at) === "") return [];
  const number = (place: number) => {
    try {
      return measuredNumberText(cell(place));
    } catch (problem) {
      say(place, problem instanceof Error ? problem.message : "Not a number.");
      return null;
    }
  };
  const value = number(at);
  const errorAt = where(`${quantity}-error`);
  const error = errorAt >= 0 && cell(errorAt) !== "" ? number(errorAt) : null;
  if (error !== null && Number(error) <= 0) {
    say(errorAt, "An error is above zero.");
    return [];
  }
  if (quantity === "parallax" && errorAt >= 0 && cell(errorAt) === "") {
    say(errorAt, "The parallax has no error, so no range follows from it.");
    return [];
  }
  if (value === null) return [];
  const unit = mapping.columns[at]?.unit ?? "";
  const errorUnit = errorAt >= 0 ? mapping.columns[errorAt]?.unit : unit;
  if (errorUnit !== unit) {
    say(errorAt, `The error is in ${errorUnit}, its value in ${unit}.`);
    return [];
  }
  const rawText = error === null ? cell(at) : `${cell(at)} ± ${cell(errorAt)}`;
  return [{ quantity, rawText: rawText.slice(0, 200), value, error, unit, column: columns[at]?.name ?? "" }];
}
