import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { duplicateKey } from "#app/database/database-error.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { Conflict } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { CreateRecord } from "./record-input.ts";
import { writeNames } from "./record-names.server.ts";
import { requireSource } from "./require-source.server.ts";

export type NewRecord = z.output<typeof CreateRecord>;

/** The columns behind a record's form. */
export function recordColumns(input: NewRecord) {
  const { name, kind, ra, dec, positionEpoch, positionSourceId, positionLocator, positionNote } = input;
  return {
    name,
    kind,
    raText: ra?.text ?? null,
    raDeg: ra?.deg ?? null,
    decText: dec?.text ?? null,
    decDeg: dec?.deg ?? null,
    positionEpoch,
    positionSourceId,
    positionLocator,
    positionNote,
  };
}

/** Writes a record inside a change. @throws Invalid at `identifiers`, `positionSourceId` */
async function insertRecord(c: Change, recordId: string, input: NewRecord): Promise<string> {
  const { submission: _, ...after } = input;
  await requireSource(c, "positionSourceId", input.positionSourceId);
  await c.tx.insert(record).values({ id: recordId, ...recordColumns(input), createdBy: c.actor.personId });
  await writeNames(c, recordId, input);
  c.audit({ objectType: "record", objectId: recordId, objectName: input.name, after });
  return recordId;
}

/** Opens a record. The same form sent twice opens it once. @throws Invalid at `identifiers`, Conflict */
export async function createRecord(actor: Actor | null, input: NewRecord): Promise<string> {
  authorise(actor, "record.write");
  const recordId = input.submission ?? newId();
  try {
    return await change(actor, "catalogue.create-record", (c) => insertRecord(c, recordId, input));
  } catch (error) {
    if (duplicateKey(error) !== "PRIMARY") throw error;
    await refuseOtherInput(actor, recordId, input);
    return recordId;
  }
}

/** @throws Conflict unless what was kept from this form before is what it holds now */
async function refuseOtherInput(actor: Actor, recordId: string, input: NewRecord): Promise<void> {
  const [kept] = await db().select().from(record).where(eq(record.id, recordId));
  const columns = recordColumns(input);
  const names = Object.keys(columns) as (keyof typeof columns)[];
  if (kept?.createdBy === actor.personId && names.every((name) => kept[name] === columns[name])) return;
  throw new Conflict("A record was kept from this form already. Send it once more if you mean another one.");
}
