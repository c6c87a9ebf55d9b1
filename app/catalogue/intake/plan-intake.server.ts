import { and, eq, inArray } from "drizzle-orm";
import type { Reader } from "#app/database/db.server.ts";
import { measurement, record, recordIdentifier } from "#app/database/schema/catalogue.ts";
import type { Mapping } from "./mapping.ts";
import { type PlannedRow, type Problem, planRow } from "./plan-row.ts";
import type { Table } from "./table.ts";

export interface IntakePlan {
  /** Rows that become new records. */
  created: PlannedRow[];
  /** Rows that add measurements to a record there is. */
  updated: (PlannedRow & { recordId: string })[];
  /** Rows of which everything is kept already. */
  same: number;
  badRows: number;
  problems: Problem[];
}

const BATCH = 1000;

/** What would become of a table. Nothing is written; applying works from the same plan. */
export async function planIntake(reader: Reader, table: Table, mapping: Mapping): Promise<IntakePlan> {
  const rows = table.rows.map((row) => planRow(row, table.columns, mapping));
  refuseRepeated(rows);
  const good = rows.filter((row) => row.problems.length === 0);
  const known = await findRecords(reader, good);
  const kept = await findMeasurements(reader, [...new Set(known.values())], mapping.options.sourceId ?? "");
  const plan: IntakePlan = {
    created: [],
    updated: [],
    same: 0,
    badRows: rows.length - good.length,
    problems: rows.flatMap((row) => row.problems),
  };
  for (const row of good) {
    const recordId = known.get(row.row);
    if (!recordId) {
      plan.created.push(row);
      continue;
    }
    const fresh = row.measurements.filter((one) => !kept.has(keyOf(recordId, one)));
    if (fresh.length === 0) plan.same += 1;
    else plan.updated.push({ ...row, measurements: fresh, recordId });
  }
  return plan;
}

const keyOf = (recordId: string, one: { quantity: string; value: string; error: string | null; unit: string }) =>
  [recordId, one.quantity, one.value, one.error ?? "", one.unit].join("\u0000");

/** An identifier or a name that stands in two rows of the file: the second one is told. */
function refuseRepeated(rows: PlannedRow[]): void {
  const first = new Map<string, number>();
  for (const row of rows) {
    for (const { catalogue, value } of row.identifiers) note(first, row, `${catalogue} ${value}`, catalogue);
    if (row.name) note(first, row, row.name, "name");
  }
}

function note(first: Map<string, number>, row: PlannedRow, what: string, column: string): void {
  const before = first.get(what.toLowerCase());
  if (before === undefined) first.set(what.toLowerCase(), row.row);
  else row.problems.push({ row: row.row, column, value: what, reason: `It stands in row ${before} already.` });
}

/** Row number -> the record it belongs to: by identifier, else by exactly the same name. */
async function findRecords(reader: Reader, rows: PlannedRow[]): Promise<Map<number, string>> {
  const byIdentifier = new Map<string, string>();
  const values = [...new Set(rows.flatMap((row) => row.identifiers.map((one) => one.value)))];
  for (let from = 0; from < values.length; from += BATCH) {
    const found = await reader
      .select()
      .from(recordIdentifier)
      .where(inArray(recordIdentifier.value, values.slice(from, from + BATCH)));
    for (const one of found) byIdentifier.set(`${one.catalogue} ${one.value}`, one.recordId);
  }
  const byName = new Map<string, string>();
  const names = [...new Set(rows.map((row) => row.name))];
  for (let from = 0; from < names.length; from += BATCH) {
    const found = await reader
      .select({ id: record.id, name: record.name })
      .from(record)
      .where(inArray(record.name, names.slice(from, from + BATCH)));
    for (const one of found) byName.set(one.name.toLowerCase(), one.id);
  }
  const found = new Map<number, string>();
  for (const row of rows) {
    const ids = row.identifiers.map((one) => byIdentifier.get(`${one.catalogue} ${one.value}`));
    const recordId = ids.find((id) => id !== undefined) ?? byName.get(row.name.toLowerCase());
    if (recordId) found.set(row.row, recordId);
  }
  return found;
}

/** What these records have from this source already. */
async function findMeasurements(reader: Reader, recordIds: string[], sourceId: string): Promise<Set<string>> {
  const kept = new Set<string>();
  for (let from = 0; from < recordIds.length; from += BATCH) {
    const rows = await reader
      .select()
      .from(measurement)
      .where(
        and(inArray(measurement.recordId, recordIds.slice(from, from + BATCH)), eq(measurement.sourceId, sourceId)),
      );
    for (const row of rows) kept.add(keyOf(row.recordId, row));
  }
  return kept;
}
