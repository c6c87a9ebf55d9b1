import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { newId } from "#app/database/new-id.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { authorise } from "#app/people/authorise.ts";
import type { CreateRecord } from "./record-input.ts";
import { writeNames } from "./record-names.server.ts";

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

/** Writes a record inside a change; also how intake writes them. @throws Invalid at `identifiers` */
export async function insertRecord(c: Change, input: NewRecord): Promise<string> {
  const recordId = newId();
  await c.tx.insert(record).values({ id: recordId, ...recordColumns(input), createdBy: c.actor.personId });
  await writeNames(c, recordId, input);
  c.audit({ objectType: "record", objectId: recordId, objectName: input.name, after: input });
  return recordId;
}

export async function createRecord(actor: Actor | null, input: NewRecord): Promise<string> {
  authorise(actor, "record.write");
  return change(actor, "catalogue.create-record", (c) => insertRecord(c, input));
}
