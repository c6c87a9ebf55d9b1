import type { Actor } from "#app/audit/actor.ts";
import { addMeasurement } from "#app/catalogue/add-measurement.server.ts";
import { adoptParallax } from "#app/catalogue/adopt-parallax.server.ts";
import { createRecord } from "#app/catalogue/create-record.server.ts";
import { createSource } from "#app/catalogue/create-source.server.ts";
import { AddMeasurement } from "#app/catalogue/measurement-input.ts";
import { AdoptParallax, CreateRecord } from "#app/catalogue/record-input.ts";
import { CreateSource } from "#app/catalogue/source-input.ts";
import { vetRecord } from "#app/catalogue/vet-record.server.ts";
import { newId } from "#app/database/new-id.ts";
import { parseInput } from "#app/parse-input.ts";
// Touching a record asks that whoever reads it in a seal be registered.
import "#app/review/register.server.ts";

let count = 0;

/** A source with a DOI of its own. */
export async function makeSource(actor: Actor, overrides: Record<string, unknown> = {}): Promise<string> {
  const doi = `10.9999/${newId()}`;
  return createSource(
    actor,
    parseInput(CreateSource, { title: "A table", authors: "Tern, A.", year: "2020", doi, ...overrides }),
  );
}

/** A record with a position that misses nothing. */
export async function makeRecord(actor: Actor, overrides: Record<string, unknown> = {}): Promise<string> {
  count += 1;
  const positionSourceId = await makeSource(actor);
  return createRecord(
    actor,
    parseInput(CreateRecord, {
      name: `Star ${count}`,
      kind: "star",
      ra: "279.23410832",
      dec: "+38.78299311",
      positionEpoch: "1991.25",
      positionSourceId,
      positionLocator: "row 1",
      ...overrides,
    }),
  );
}

export async function makeMeasurement(actor: Actor, recordId: string, overrides: Record<string, unknown> = {}) {
  const sourceId = await makeSource(actor);
  const printed = "130.23 ± 0.36";
  return addMeasurement(
    actor,
    parseInput(AddMeasurement, {
      recordId,
      quantity: "parallax",
      printed,
      unit: "mas",
      epoch: "1991.25",
      sourceId,
      locator: "row 1",
      ...overrides,
    }),
  );
}

/** A vetted star: entered and adopted by `editor`, vetted by `scientist`. Versions: 1 created, 2 adopted, 3 vetted. */
export async function makeVettedStar(
  editor: Actor,
  scientist: Actor,
  overrides: { record?: Record<string, unknown>; parallax?: Record<string, unknown> } = {},
): Promise<{ recordId: string; measurementId: string; version: number }> {
  const recordId = await makeRecord(editor, overrides.record);
  const measurementId = await makeMeasurement(editor, recordId, overrides.parallax);
  await adoptParallax(
    editor,
    parseInput(AdoptParallax, { recordId, version: 1, measurementId, reason: "The only one" }),
  );
  await vetRecord(scientist, { recordId, version: 2 });
  return { recordId, measurementId, version: 3 };
}
