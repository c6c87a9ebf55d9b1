import { and, eq, inArray, ne, or } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { CHANGED_SINCE_READ, duplicateKey } from "#app/database/database-error.ts";
import { record, recordIdentifier, recordName } from "#app/database/schema/catalogue.ts";
import { Invalid } from "#app/errors.ts";
import type { Identifier, OtherName } from "./record-input.ts";

/** @throws Invalid at `identifiers`, naming the record that has one of them already */
async function refuseTaken(c: Change, recordId: string, identifiers: Identifier[]): Promise<void> {
  if (identifiers.length === 0) return;
  const taken = await c.tx
    .select({
      catalogue: recordIdentifier.catalogue,
      value: recordIdentifier.value,
      recordId: record.id,
      name: record.name,
    })
    .from(recordIdentifier)
    .innerJoin(record, eq(record.id, recordIdentifier.recordId))
    .where(
      and(
        ne(recordIdentifier.recordId, recordId),
        or(
          ...identifiers.map((one) =>
            and(eq(recordIdentifier.catalogue, one.catalogue), eq(recordIdentifier.value, one.value)),
          ),
        ),
      ),
    );
  if (taken.length === 0) return;
  const messages = taken.map((one) => `${one.catalogue} ${one.value} is ${one.name}'s already.`);
  const owners = new Map(taken.map((one) => [one.recordId, one.name]));
  const links = [...owners].map(([id, name]) => ({ to: `/stars/${id}`, label: `Open ${name}` }));
  throw new Invalid({ identifiers: messages }, undefined, links);
}

/** Somebody else has just taken one of the identifiers: the change is run again, and then finds who. */
export function runAgain(error: unknown): never {
  if (duplicateKey(error) !== "record_identifier_unique") throw error;
  throw Object.assign(new Error("An identifier was taken meanwhile", { cause: error }), { errno: CHANGED_SINCE_READ });
}

/** Replaces the other names and the identifiers of a record. */
export async function writeNames(
  c: Change,
  recordId: string,
  names: { otherNames: OtherName[]; identifiers: Identifier[] },
): Promise<void> {
  const unique = new Map(names.identifiers.map((one) => [`${one.catalogue} ${one.value}`, one]));
  await refuseTaken(c, recordId, [...unique.values()]);
  await c.tx.delete(recordName).where(eq(recordName.recordId, recordId));
  await c.tx.delete(recordIdentifier).where(eq(recordIdentifier.recordId, recordId));
  const preferred = new Set<string>();
  const nameRows = names.otherNames.map((one) => {
    // The first name of a language is the one that is shown in it.
    const first = one.language !== null && !preferred.has(one.language);
    if (one.language) preferred.add(one.language);
    return { recordId, name: one.name, language: one.language, preferred: first };
  });
  if (nameRows.length > 0) await c.tx.insert(recordName).values(nameRows);
  if (unique.size > 0) {
    const rows = [...unique.values()].map((one) => ({ recordId, ...one }));
    await c.tx.insert(recordIdentifier).values(rows).catch(runAgain);
  }
}

/** Other names and identifiers of records, in the order in which they were written. */
export async function readNames(tx: Change["tx"], recordIds: string[]) {
  const ids = recordIds.length > 0 ? recordIds : ["-"];
  const [names, identifiers] = [
    await tx.select().from(recordName).where(inArray(recordName.recordId, ids)).orderBy(recordName.id),
    await tx
      .select()
      .from(recordIdentifier)
      .where(inArray(recordIdentifier.recordId, ids))
      .orderBy(recordIdentifier.id),
  ];
  return { names, identifiers };
}
