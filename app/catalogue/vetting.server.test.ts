import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { Conflict, Forbidden, Invalid, Locked } from "#app/errors.ts";
import { parseInput } from "#app/parse-input.ts";
import { makeMeasurement, makeRecord } from "#tests/factories/catalogue.ts";
import { makeActor } from "#tests/factories/person.ts";
import { adoptParallax } from "./adopt-parallax.server.ts";
import { editRecord } from "./edit-record.server.ts";
import { confirmMeasurement, rejectMeasurement } from "./judge-measurement.server.ts";
import { openRecord } from "./open-record.server.ts";
import { readRecord } from "./read-record.server.ts";
import { AdoptParallax, EditRecord } from "./record-input.ts";
import { vetRecord } from "./vet-record.server.ts";

const versionOf = async (recordId: string) => (await openRecord({ tx: db() as never }, recordId)).version;

async function waiting(overrides: { parallax?: object } = {}) {
  const [editor, scientist] = [await makeActor("editor"), await makeActor("scientist")];
  const recordId = await makeRecord(editor);
  const measurementId = await makeMeasurement(editor, recordId, { ...overrides.parallax });
  await adoptParallax(editor, parseInput(AdoptParallax, { recordId, version: 1, measurementId, reason: "Newest" }));
  return { editor, scientist, recordId, measurementId };
}

test("whoever changed the name or position once does not vet the record, however often others change it after", async () => {
  const { editor, recordId } = await waiting();
  const both = await makeActor("editor", "scientist");
  const edit = async (by: typeof both, name: string) =>
    editRecord(
      by,
      parseInput(EditRecord, { recordId, version: await versionOf(recordId), ...(await kept(editor, recordId)), name }),
    );
  await edit(both, "By both");
  await edit(editor, "By the editor");
  const version = await versionOf(recordId);
  await expect(vetRecord(both, { recordId, version })).rejects.toBeInstanceOf(Forbidden);
  expect((await readRecord(both, recordId)).isOwnWork).toBe(true);
  const another = await makeActor("scientist");
  await vetRecord(another, { recordId, version });
  expect((await readRecord(another, recordId)).record).toMatchObject({ state: "vetted", vetterName: another.name });
});

/** What the edit form holds when it is opened. */
async function kept(by: Awaited<ReturnType<typeof makeActor>>, recordId: string) {
  const { record } = await readRecord(by, recordId);
  const { kind, raText, decText, positionEpoch, positionSourceId, positionLocator } = record;
  return { kind, ra: raText ?? "", dec: decText ?? "", positionEpoch, positionSourceId, positionLocator };
}

test("whoever entered a measurement that still stands does not vet; once it is set aside they may", async () => {
  const { scientist, recordId } = await waiting();
  const own = await makeMeasurement(scientist, recordId, { printed: "128 ± 2" });
  await expect(vetRecord(scientist, { recordId, version: 2 })).rejects.toBeInstanceOf(Forbidden);
  await rejectMeasurement(scientist, { measurementId: own, version: 1, reason: "A slip" });
  await vetRecord(scientist, { recordId, version: 2 });
});

test("a prior-led parallax is vetted only with a named prior", async () => {
  const { editor, scientist, recordId, measurementId } = await waiting({ parallax: { printed: "1 ± 1" } });
  const refusal = await vetRecord(scientist, { recordId, version: 2 }).catch((error) => error);
  expect(refusal).toBeInstanceOf(Invalid);
  expect(Object.keys(refusal.fields)).toEqual(["prior"]);
  const prior = { prior: "uniform-distance", priorScalePc: "5000", priorReason: "Within the disc" };
  await adoptParallax(
    editor,
    parseInput(AdoptParallax, { recordId, version: 2, measurementId, reason: "x", ...prior }),
  );
  await vetRecord(scientist, { recordId, version: 3 });
});

test("a value without a source cannot be confirmed, and an editor confirms nothing", async () => {
  const { editor, scientist, recordId } = await waiting();
  const bare = await makeMeasurement(editor, recordId, { printed: "9 ± 1", sourceId: "", fromMemory: "on" });
  const confirm = { measurementId: bare, version: 1, reason: "agrees" };
  await expect(confirmMeasurement(scientist, confirm)).rejects.toBeInstanceOf(Locked);
  await expect(confirmMeasurement(await makeActor("editor"), confirm)).rejects.toBeInstanceOf(Forbidden);
});

test("an editor takes back what they entered until it is vetted, and nothing of others", async () => {
  const { editor, scientist, recordId } = await waiting();
  const slip = { measurementId: await makeMeasurement(editor, recordId, { printed: "13.02 ± 0.36" }), version: 1 };
  const earlier = await makeMeasurement(editor, recordId, { printed: "128.93 ± 0.55" });
  const other = await makeActor("editor");
  await expect(rejectMeasurement(other, { ...slip, reason: "Not mine" })).rejects.toBeInstanceOf(Forbidden);
  await rejectMeasurement(editor, { ...slip, reason: "A slip of the point" });
  await vetRecord(scientist, { recordId, version: 2 });
  const { ledger } = await readRecord(editor, recordId);
  expect(ledger.map((one) => one.state)).toEqual(["vetted", "rejected", "vetted"]);
  const reject = { measurementId: earlier, version: 1, reason: "Superseded" };
  await expect(rejectMeasurement(editor, reject)).rejects.toBeInstanceOf(Forbidden);
  await rejectMeasurement(scientist, reject);
});

test("what came to the ledger after the page was opened is not vetted unseen", async () => {
  const { editor, scientist, recordId } = await waiting();
  const { ledgerMark } = await readRecord(scientist, recordId);
  await makeMeasurement(editor, recordId, { quantity: "colour-bv", printed: "5", unit: "mag" });
  const vet = (ledger: string) => vetRecord(scientist, { recordId, version: 2, ledger });
  await expect(vet(ledgerMark)).rejects.toBeInstanceOf(Conflict);
  expect((await readRecord(scientist, recordId)).record.state).toBe("draft");
  await vet((await readRecord(scientist, recordId)).ledgerMark);
});
