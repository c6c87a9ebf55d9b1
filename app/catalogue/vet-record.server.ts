import { and, eq, inArray, ne } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import type { Reader } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { measurement, type record } from "#app/database/schema/catalogue.ts";
import { Conflict, type FieldErrors, Forbidden, Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { ledgerMark } from "./ledger-mark.ts";
import { closeRecord, openRecord, UNVETTED } from "./open-record.server.ts";
import type { UnvetRecord, VetRecord } from "./record-input.ts";
import { type GateFacts, missingForVetting } from "./vetting-gate.ts";

type RecordRow = typeof record.$inferSelect;

/** The gate's facts of a record, and who has a hand in it. */
export async function readGate(reader: Reader, of: RecordRow): Promise<{ facts: GateFacts; hands: string[] }> {
  const ledger = await reader
    .select()
    .from(measurement)
    .where(and(eq(measurement.recordId, of.id), ne(measurement.state, "rejected")));
  const adopted = ledger.find((one) => one.id === of.adoptedParallaxId) ?? null;
  const editors = await readEditors(reader, of.id);
  const hands = [of.createdBy, of.adoptedBy, ...editors, ...ledger.map((one) => one.enteredBy)];
  return { facts: { ...of, adopted }, hands: [...new Set(hands.filter((id) => id !== null))] };
}

/** Everybody who ever changed the record's names or position: the audit log does not forget. */
async function readEditors(reader: Reader, recordId: string): Promise<(string | null)[]> {
  const rows = await reader
    .selectDistinct({ personId: auditEntry.personId })
    .from(auditEntry)
    .where(
      and(
        eq(auditEntry.objectType, "record"),
        eq(auditEntry.objectId, recordId),
        eq(auditEntry.verb, "catalogue.edit-record"),
      ),
    );
  return rows.map((row) => row.personId);
}

/**
 * A scientist vouches for a record that others entered.
 * @throws Forbidden for one's own hand in it, Invalid with every missing field, Conflict
 */
export async function vetRecord(actor: Actor | null, input: z.output<typeof VetRecord>): Promise<void> {
  authorise(actor, "record.vet");
  await change(actor, "catalogue.vet-record", async (c) => {
    const opened = await openRecord(c, input.recordId);
    if (opened.state === "vetted") return c.unchanged();
    const { facts, hands } = await readGate(c.tx, opened);
    if (hands.includes(actor.personId)) {
      throw new Forbidden("You have entered some of this record yourself, so somebody else has to vet it.");
    }
    if (input.ledger !== undefined && input.ledger !== ledgerMark(await readLedger(c, opened))) {
      throw new Conflict("A measurement was added or judged since you opened this page. Look at it, then vet.");
    }
    refuseMissing(facts);
    const set = { state: "vetted" as const, vettedBy: actor.personId, vettedAt: new Date() };
    await closeRecord(c, opened, input.version, set, { before: { state: "draft" }, after: { state: "vetted" } });
    await markLedger(c, opened);
  });
}

function refuseMissing(facts: GateFacts): void {
  const missing = missingForVetting(facts);
  if (missing.length === 0) return;
  const fields: FieldErrors = {};
  for (const { field, message } of missing) fields[field] = [message];
  throw new Invalid(fields, missing.map((one) => one.message).join(" "));
}

function readLedger(c: Change, of: RecordRow) {
  return c.tx.select({ version: measurement.version }).from(measurement).where(eq(measurement.recordId, of.id));
}

/** What is cited and compared is vetted with its record. */
async function markLedger(c: Change, of: RecordRow): Promise<void> {
  const rows = await c.tx
    .select()
    .from(measurement)
    .where(and(eq(measurement.recordId, of.id), eq(measurement.state, "proposed"), eq(measurement.fromMemory, false)));
  const ids = rows.filter((row) => row.sourceId !== null).map((row) => row.id);
  if (ids.length > 0) await c.tx.update(measurement).set({ state: "vetted" }).where(inArray(measurement.id, ids));
}

/** Takes a vetting back, with the reason. @throws Conflict, NotFound */
export async function unvetRecord(actor: Actor | null, input: z.output<typeof UnvetRecord>): Promise<void> {
  authorise(actor, "record.vet");
  await change(actor, "catalogue.unvet-record", async (c) => {
    const opened = await openRecord(c, input.recordId);
    if (opened.state === "draft") return c.unchanged();
    const states = { before: { state: "vetted" }, after: { state: "draft" }, note: input.reason };
    await closeRecord(c, opened, input.version, UNVETTED, states);
  });
}
