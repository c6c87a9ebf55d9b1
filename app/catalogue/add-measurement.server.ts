import { and, eq, ne } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { newId } from "#app/database/new-id.ts";
import { measurement } from "#app/database/schema/catalogue.ts";
import { authorise } from "#app/people/authorise.ts";
import type { NewMeasurement } from "./measurement-input.ts";
import { openRecord } from "./open-record.server.ts";
import { QUANTITY_FACTS, toCanonical } from "./quantities.ts";
import { requireSource } from "./require-source.server.ts";

/** The columns behind a measurement; also how intake writes them. */
export function measurementColumns(input: NewMeasurement, enteredBy: string) {
  const { quantity, value, error, unit } = input;
  return {
    ...input,
    enteredBy,
    valueCanonical: toCanonical(quantity, value, unit),
    errorCanonical: error === null ? null : toCanonical(quantity, error, unit),
  };
}

/** Proposes a measurement. Nothing is adopted by it. The same form sent twice proposes it once. @throws Invalid, NotFound */
export async function addMeasurement(actor: Actor | null, input: NewMeasurement): Promise<string> {
  authorise(actor, "record.write");
  return change(actor, "catalogue.add-measurement", (c) => insertMeasurement(c, input));
}

async function insertMeasurement(c: Change, input: NewMeasurement): Promise<string> {
  const opened = await openRecord(c, input.recordId);
  const same = await readSame(c, input);
  if (same) {
    c.unchanged();
    return same;
  }
  await requireSource(c, "sourceId", input.sourceId);
  const id = newId();
  await c.tx.insert(measurement).values({ id, ...measurementColumns(input, c.actor.personId) });
  c.audit({
    objectType: "record",
    objectId: opened.id,
    objectName: opened.name,
    after: { measurement: id, ...input },
    note: `${QUANTITY_FACTS[input.quantity].label}: ${input.rawText} ${input.unit}`,
  });
  // Colour and brightness are read without being adopted, so a new one may move a picture.
  c.touch({ type: "record", id: opened.id });
  return id;
}

/** What says exactly the same of the record already and is not set aside. */
async function readSame(c: Change, input: NewMeasurement): Promise<string | undefined> {
  const { recordId, quantity } = input;
  const standing = await c.tx
    .select()
    .from(measurement)
    .where(
      and(eq(measurement.recordId, recordId), eq(measurement.quantity, quantity), ne(measurement.state, "rejected")),
    );
  const names = Object.keys(input) as (keyof NewMeasurement)[];
  return standing.find((row) => names.every((name) => row[name] === input[name]))?.id;
}
