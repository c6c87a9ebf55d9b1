import { eq } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { NotFound } from "#app/errors.ts";

/** Reads a record and holds it until the change is done: of two who press at once, one comes after the other. @throws NotFound */
export async function openRecord(c: Pick<Change, "tx">, recordId: string) {
  const [found] = await c.tx.select().from(record).where(eq(record.id, recordId)).for("update");
  if (!found) throw new NotFound("There is no such record.");
  return found;
}

type OpenRecord = Awaited<ReturnType<typeof openRecord>>;

/** What vetting said no longer holds once something that was vetted changes. */
export const UNVETTED = { state: "draft" as const, vettedBy: null, vettedAt: null };

/**
 * Closes a change of a record: version compared and counted up, audit row, seals looked at.
 * @throws Conflict when somebody else saved first
 */
export async function closeRecord(
  c: Change,
  opened: OpenRecord,
  seenVersion: number,
  set: Partial<typeof record.$inferInsert>,
  states: { before: unknown; after: unknown; note?: string },
): Promise<void> {
  await compareAndSet(c.tx, record, opened.id, seenVersion, set);
  c.audit({ objectType: "record", objectId: opened.id, objectName: set.name ?? opened.name, ...states });
  c.touch({ type: "record", id: opened.id });
}
