import { asc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { measurement, record, recordIdentifier, recordName, source } from "#app/database/schema/catalogue.ts";
import { person } from "#app/database/schema/people.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { shortCitation } from "./citation.ts";
import { distanceOf, priorOf } from "./distance-of.ts";
import { mayConfirm, mayReject } from "./judge-measurement.server.ts";
import { ledgerMark } from "./ledger-mark.ts";
import { readGate } from "./vet-record.server.ts";
import { missingForVetting } from "./vetting-gate.ts";

/** Everything a record's page shows. @throws NotFound */
export async function readRecord(actor: Actor | null, recordId: string) {
  authorise(actor, "catalogue.read");
  const [found] = await db().select().from(record).where(eq(record.id, recordId));
  if (!found) throw new NotFound("There is no such record.");
  const [names, identifiers, ledger, sources, vetter] = await Promise.all([
    db().select().from(recordName).where(eq(recordName.recordId, recordId)).orderBy(asc(recordName.id)),
    db()
      .select()
      .from(recordIdentifier)
      .where(eq(recordIdentifier.recordId, recordId))
      .orderBy(asc(recordIdentifier.id)),
    readLedger(actor, recordId),
    readSourceChoices(actor),
    found.vettedBy ? db().select({ name: person.name }).from(person).where(eq(person.id, found.vettedBy)) : [],
  ]);
  const { facts, hands } = await readGate(db(), found);
  const adopted = ledger.find((one) => one.id === found.adoptedParallaxId) ?? null;
  return {
    record: {
      ...found,
      createdAt: found.createdAt.toISOString(),
      adoptedAt: found.adoptedAt?.toISOString() ?? null,
      vettedAt: found.vettedAt?.toISOString() ?? null,
      vetterName: vetter[0]?.name ?? null,
    },
    names: names.map(({ name, language, preferred }) => ({ name, language, preferred })),
    identifiers: identifiers.map(({ catalogue, value }) => ({ catalogue, value })),
    ledger,
    ledgerMark: ledgerMark(ledger),
    adopted,
    answer: distanceOf(adopted, priorOf(found.prior, found.priorScalePc)),
    sources,
    positionSource: sources.find((one) => one.id === found.positionSourceId) ?? null,
    missing: missingForVetting(facts),
    isOwnWork: hands.includes(actor.personId),
  };
}

/** Every measurement in the order of entering, and what this person may do with each. */
async function readLedger(actor: Actor, recordId: string) {
  const rows = await db()
    .select({ measurement, source, enteredBy: person.name })
    .from(measurement)
    .leftJoin(source, eq(source.id, measurement.sourceId))
    .innerJoin(person, eq(person.id, measurement.enteredBy))
    .where(eq(measurement.recordId, recordId))
    .orderBy(asc(measurement.id));
  return rows.map(({ measurement: one, source: from, enteredBy }) => ({
    ...one,
    createdAt: one.createdAt.toISOString(),
    enteredBy,
    mayReject: mayReject(actor, one),
    mayConfirm: mayConfirm(actor, one),
    source: from ? { id: from.id, citation: shortCitation(from), bibcode: from.bibcode, doi: from.doi } : null,
  }));
}

/** Every source by its citation, for choosing one in a form. */
export async function readSourceChoices(actor: Actor | null) {
  authorise(actor, "catalogue.read");
  const rows = await db().select().from(source).orderBy(asc(source.authors), asc(source.year));
  return rows.map((row) => ({ id: row.id, citation: shortCitation(row), bibcode: row.bibcode, doi: row.doi }));
}

/** What the form of a new record needs: the sources, and the id that makes it one form. */
export async function readNewRecord(actor: Actor | null) {
  authorise(actor, "record.write");
  return { sources: await readSourceChoices(actor), submission: newId() };
}
