import { setImmediate } from "node:timers/promises";
import { and, eq, inArray } from "drizzle-orm";
import type { Reader } from "#app/database/db.server.ts";
import { measurement } from "#app/database/schema/catalogue.ts";
import type { Mapping } from "./mapping.ts";
import { inBatches, type Match, matchRecords, type NamingColumns } from "./match-records.server.ts";
import { type PlannedRow, type Problem, planRow } from "./plan-row.ts";
import type { Table } from "./table.ts";

export interface IntakePlan {
  /** Rows that become new records. */
  created: PlannedRow[];
  /** Rows that add measurements to a record there is. */
  updated: (PlannedRow & Match)[];
  /** Rows of which everything is kept already. */
  same: number;
  badRows: number;
  /** Everything that is wrong in bad rows. */
  problems: Problem[];
  /** What a person should know of rows that are taken. */
  warnings: Problem[];
}

/** What would become of a table. Nothing is written; applying works from the same plan. */
export async function planIntake(reader: Reader, table: Table, mapping: Mapping): Promise<IntakePlan> {
  const rows: PlannedRow[] = [];
  for await (const row of inTurns(table.rows)) rows.push(planRow(row, table.columns, mapping));
  const columns = namingColumns(table, mapping);
  refuseRepeated(rows, columns);
  const known = await matchRecords(reader, rows.filter(isGood), columns);
  const recordIds = [...known.values()].map((one) => one.recordId);
  const kept = await findMeasurements(reader, recordIds, mapping.options.sourceId ?? "");
  const plan: IntakePlan = { created: [], updated: [], same: 0, badRows: 0, problems: [], warnings: [] };
  for await (const row of inTurns(rows.filter(isGood))) place(plan, row, known.get(row.row), kept, columns);
  const bad = rows.filter((row) => !isGood(row));
  plan.badRows = bad.length;
  plan.problems = bad.flatMap((row) => row.problems);
  return plan;
}

const TURN = 500;

/** Goes through many rows and lets others be answered in between. */
export async function* inTurns<T>(rows: readonly T[]): AsyncGenerator<T> {
  for (let from = 0; from < rows.length; from += TURN) {
    yield* rows.slice(from, from + TURN);
    await setImmediate();
  }
}

const isGood = (row: PlannedRow) => row.problems.length === 0;

function place(
  plan: IntakePlan,
  row: PlannedRow,
  match: Match | undefined,
  kept: Set<string>,
  columns: NamingColumns,
): void {
  const fresh = match ? row.measurements.filter((one) => !kept.has(keyOf(match.recordId, one))) : row.measurements;
  if (match && fresh.length === 0) {
    plan.same += 1;
    return;
  }
  if (match?.byNumberOnly) {
    const reason = "A record is called so already, and nothing says that it is the same star. Choose another prefix.";
    row.problems.push({ row: row.row, column: columns.name, value: row.name, reason });
    return;
  }
  plan.warnings.push(...row.warnings);
  if (match) plan.updated.push({ ...row, measurements: fresh, ...match });
  else plan.created.push(row);
}

function namingColumns(table: Table, mapping: Mapping): NamingColumns {
  const nameAt = mapping.columns.findIndex((use) => use.meaning === "name");
  const identifiers = mapping.columns.flatMap((use, at): [string, string][] =>
    use.meaning === "identifier" && use.catalogue ? [[use.catalogue, table.columns[at]?.name ?? ""]] : [],
  );
  const prefix = mapping.options.namePrefix;
  return {
    name: table.columns[nameAt]?.name ?? "",
    identifiers: new Map(identifiers),
    numbered: (row) => prefix !== null && row.name === `${prefix} ${row.row}`,
  };
}

const keyOf = (recordId: string, one: { quantity: string; value: string; error: string | null; unit: string }) =>
  [recordId, one.quantity, one.value, one.error ?? "", one.unit].join("\u0000");

/** An identifier or a name that stands in two rows of the file: the second one is told. */
function refuseRepeated(rows: PlannedRow[], columns: NamingColumns): void {
  const first = new Map<string, number>();
  for (const row of rows) {
    for (const { catalogue, value } of row.identifiers) {
      note(first, row, `${catalogue} ${value}`, columns.identifiers.get(catalogue) ?? catalogue);
    }
    if (row.name) note(first, row, row.name, columns.name);
  }
}

function note(first: Map<string, number>, row: PlannedRow, what: string, column: string): void {
  const before = first.get(what.toLowerCase());
  if (before === undefined) first.set(what.toLowerCase(), row.row);
  else row.problems.push({ row: row.row, column, value: what, reason: `It stands in row ${before} already.` });
}

/** What these records have from this source already. */
async function findMeasurements(reader: Reader, recordIds: string[], sourceId: string): Promise<Set<string>> {
  const rows = await inBatches(recordIds, (some) =>
    reader
      .select()
      .from(measurement)
      .where(and(inArray(measurement.recordId, some), eq(measurement.sourceId, sourceId))),
  );
  return new Set(rows.map((row) => keyOf(row.recordId, row)));
}
