import { eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { intake, measurement, record, recordIdentifier, source } from "#app/database/schema/catalogue.ts";
import { Conflict, Locked, NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { measurementColumns } from "../add-measurement.server.ts";
import { distanceOf } from "../distance-of.ts";
import { runAgain } from "../record-names.server.ts";
import type { IntakeOptions, Mapping } from "./mapping.ts";
import type { Match } from "./match-records.server.ts";
import { openIntake } from "./open-intake.server.ts";
import { inTurns, planIntake } from "./plan-intake.server.ts";
import type { PlannedMeasurement, PlannedRow } from "./plan-row.ts";

const BATCH = 500;

export interface Applied {
  created: number;
  updated: number;
  same: number;
  bad: number;
}

type NewRecord = typeof record.$inferInsert;
type NewMeasurement = typeof measurement.$inferInsert;

interface Writing {
  records: NewRecord[];
  identifiers: (typeof recordIdentifier.$inferInsert)[];
  measurements: NewMeasurement[];
}

/**
 * Writes what the dry run showed, all in one transaction. With bad rows only where the person asked for the good ones.
 * @throws Locked while rows are bad or once it was applied, Conflict when somebody else was first
 */
export async function applyIntake(
  actor: Actor | null,
  input: { intakeId: string; version: number; goodRowsOnly: boolean },
): Promise<Applied> {
  authorise(actor, "intake.write");
  const { table, mapping } = await openIntake(db(), input.intakeId);
  return change(actor, "intake.apply", async (c) => {
    const opened = await holdIntake(c, input.intakeId, mapping);
    const plan = await planIntake(c.tx, table, mapping);
    if (plan.badRows > 0 && !input.goodRowsOnly) {
      const rows = plan.badRows === 1 ? "1 row is bad." : `${plan.badRows} rows are bad.`;
      throw new Locked(`${rows} Nothing was written. Mend the file, or take the good rows only.`);
    }
    const writing: Writing = { records: [], identifiers: [], measurements: [] };
    for await (const row of inTurns(plan.created)) planRecord(c, writing, row, mapping, input.intakeId);
    for await (const row of inTurns(plan.updated)) planAddition(c, writing, row, mapping.options, input.intakeId);
    await write(c, writing);
    const counts = { created: plan.created.length, updated: plan.updated.length, same: plan.same, bad: plan.badRows };
    await compareAndSet(c.tx, intake, input.intakeId, input.version, {
      state: "applied",
      appliedAt: new Date(),
      createdCount: counts.created,
      updatedCount: counts.updated,
      sameCount: counts.same,
      badCount: counts.bad,
    });
    c.audit({
      objectType: "intake",
      objectId: input.intakeId,
      objectName: opened.fileName,
      before: { state: "uploaded" },
      after: { state: "applied", ...counts },
    });
    return counts;
  });
}

const DEALT_WITH = {
  applied: "This table is in the catalogue already. Nothing was written again.",
  abandoned: "This table was given up. Send the file again to take it in.",
};

/**
 * Holds the intake and its source until the change is done, before anything else is read: of two tables of one source the
 * second one sees what the first one wrote.
 */
async function holdIntake(c: Change, intakeId: string, seen: Mapping) {
  const [opened] = await c.tx.select().from(intake).where(eq(intake.id, intakeId)).for("update");
  if (!opened) throw new NotFound("There is no such intake.");
  if (opened.state !== "uploaded") throw new Locked(DEALT_WITH[opened.state]);
  if (!seen.options.sourceId) throw new Locked("Say first what the columns mean.");
  if (JSON.stringify(opened.mapping) !== JSON.stringify(seen)) {
    throw new Conflict("The columns were changed meanwhile. Nothing was written.");
  }
  await c.tx.select({ id: source.id }).from(source).where(eq(source.id, seen.options.sourceId)).for("update");
  return opened;
}

interface Added {
  id: string;
  from: PlannedMeasurement;
}

/** What the audit log keeps of a new measurement. */
const noted = ({ id, from: { quantity, rawText, unit } }: Added) => ({ id, quantity, rawText, unit });

/** A record there is gets what the row knows of it besides. */
function planAddition(
  c: Change,
  writing: Writing,
  row: PlannedRow & Match,
  options: IntakeOptions,
  intakeId: string,
): void {
  const added = addMeasurements(c, writing, row.recordId, row, options, intakeId);
  c.audit({
    objectType: "record",
    objectId: row.recordId,
    objectName: row.recordName,
    after: { intake: intakeId, measurements: added.map(noted) },
    note: `Row ${row.row} of an intake`,
  });
  c.touch({ type: "record", id: row.recordId });
}

function planRecord(c: Change, writing: Writing, row: PlannedRow, mapping: Mapping, intakeId: string): void {
  const { options } = mapping;
  const id = newId();
  const added = addMeasurements(c, writing, id, row, options, intakeId);
  const columns: NewRecord = {
    id,
    name: row.name,
    kind: "star",
    createdBy: c.actor.personId,
    ...(row.position
      ? {
          ...row.position,
          positionEpoch: options.positionEpoch ?? options.epoch,
          positionSourceId: options.sourceId,
          positionLocator: locatorOf(options, row, "position"),
        }
      : {}),
    ...adopted(c, options, added),
  };
  writing.records.push(columns);
  for (const one of row.identifiers) writing.identifiers.push({ recordId: id, ...one });
  c.audit({
    objectType: "record",
    objectId: id,
    objectName: row.name,
    after: {
      ...columns,
      identifiers: row.identifiers.map((one) => `${one.catalogue} ${one.value}`),
      measurements: added.map(noted),
    },
    note: `Row ${row.row} of an intake`,
  });
}

const locatorOf = (options: IntakeOptions, row: PlannedRow, column: string) =>
  [options.locator, `row ${row.row}`, column].filter(Boolean).join(", ").slice(0, 200);

function addMeasurements(
  c: Change,
  writing: Writing,
  recordId: string,
  row: PlannedRow,
  options: IntakeOptions,
  intakeId: string,
): Added[] {
  return row.measurements.map((from) => {
    const id = newId();
    const { column, ...planned } = from;
    const entered = {
      recordId,
      ...planned,
      epoch: options.epoch,
      sourceId: options.sourceId,
      locator: locatorOf(options, row, `column ${column}`),
      note: null,
      fromMemory: false,
    };
    writing.measurements.push({ id, ...measurementColumns(entered, c.actor.personId), intakeId });
    return { id, from };
  });
}

/** Where the person asked for it, a new record's parallax counts at once. */
function adopted(c: Change, options: IntakeOptions, added: Added[]) {
  const parallax = options.adopt
    ? added.find((one) => one.from.quantity === "parallax" && one.from.error !== null)
    : null;
  if (!parallax) return {};
  const answer = distanceOf(parallax.from, null);
  return {
    adoptedParallaxId: parallax.id,
    adoptedReason: options.adoptReason,
    adoptedBy: c.actor.personId,
    adoptedAt: new Date(),
    regime: answer?.regime ?? null,
    distanceMethod: answer?.method ?? null,
    distancePc: answer?.pc?.value ?? null,
    distanceLowPc: answer?.pc?.low ?? null,
    distanceHighPc: answer?.pc?.high ?? null,
  };
}

async function write(c: Change, { records, identifiers, measurements }: Writing): Promise<void> {
  for (let from = 0; from < records.length; from += BATCH) {
    await c.tx.insert(record).values(records.slice(from, from + BATCH));
  }
  for (let from = 0; from < identifiers.length; from += BATCH) {
    await c.tx
      .insert(recordIdentifier)
      .values(identifiers.slice(from, from + BATCH))
      .catch(runAgain);
  }
  for (let from = 0; from < measurements.length; from += BATCH) {
    await c.tx.insert(measurement).values(measurements.slice(from, from + BATCH));
  }
}
