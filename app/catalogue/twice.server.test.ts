import { and, eq } from "drizzle-orm";
import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { measurement, record } from "#app/database/schema/catalogue.ts";
import { Conflict } from "#app/errors.ts";
import { parseInput } from "#app/parse-input.ts";
import { makeMeasurement, makeRecord, makeSource, makeVettedStar } from "#tests/factories/catalogue.ts";
import { makeActor } from "#tests/factories/person.ts";
import { addMeasurement } from "./add-measurement.server.ts";
import { adoptParallax } from "./adopt-parallax.server.ts";
import { createRecord } from "./create-record.server.ts";
import { editRecord } from "./edit-record.server.ts";
import { rejectMeasurement } from "./judge-measurement.server.ts";
import { AddMeasurement } from "./measurement-input.ts";
import { AdoptParallax, CreateRecord, EditRecord } from "./record-input.ts";
import { vetRecord } from "./vet-record.server.ts";

// Forms sent twice, and two people at one record.

const audits = (verb: string, objectId: string) =>
  db()
    .select()
    .from(auditEntry)
    .where(and(eq(auditEntry.verb, verb), eq(auditEntry.objectId, objectId)));

test("a new record's form sent twice opens one record", async () => {
  const editor = await makeActor("editor");
  const input = parseInput(CreateRecord, { name: "Twice", kind: "star", submission: newId() });
  const ids = await Promise.all([createRecord(editor, input), createRecord(editor, input)]);
  expect([...new Set([...ids, await createRecord(editor, input)])]).toEqual([input.submission]);
  expect(await audits("catalogue.create-record", ids[0] ?? "")).toHaveLength(1);
});

test("a form that was sent and then changed, or is not one's own, does not pass for kept", async () => {
  const editor = await makeActor("editor");
  const input = parseInput(CreateRecord, { name: "One", kind: "star", submission: newId() });
  await createRecord(editor, input);
  await expect(createRecord(editor, { ...input, name: "Another" })).rejects.toBeInstanceOf(Conflict);
  await expect(createRecord(await makeActor("editor"), input)).rejects.toBeInstanceOf(Conflict);
  const rows = await db()
    .select()
    .from(record)
    .where(eq(record.id, input.submission ?? ""));
  expect(rows.map((row) => row.name)).toEqual(["One"]);
});

test("a measurement sent twice, or by two people at once, is proposed once", async () => {
  const [mine, yours] = [await makeActor("editor"), await makeActor("editor")];
  const recordId = await makeRecord(mine);
  const sourceId = await makeSource(mine);
  const typed = { recordId, quantity: "parallax", printed: "5.2 ± 0.3", unit: "mas", sourceId, locator: "row 7" };
  const input = parseInput(AddMeasurement, typed);
  const ids = await Promise.all([
    addMeasurement(mine, input),
    addMeasurement(mine, input),
    addMeasurement(yours, input),
  ]);
  expect(new Set(ids).size).toBe(1);
  await addMeasurement(mine, parseInput(AddMeasurement, { ...typed, locator: "row 8" }));
  const rows = await db().select().from(measurement).where(eq(measurement.recordId, recordId));
  expect(rows).toHaveLength(2);
});

test("what was set aside may be proposed again", async () => {
  const scientist = await makeActor("scientist");
  const recordId = await makeRecord(scientist);
  const sourceId = await makeSource(scientist);
  const first = await makeMeasurement(scientist, recordId, { sourceId });
  await rejectMeasurement(scientist, { measurementId: first, version: 1, reason: "Wrong row" });
  expect(await makeMeasurement(scientist, recordId, { sourceId })).not.toBe(first);
});

test("adopting, vetting and setting aside twice is done once", async () => {
  const [editor, scientist] = [await makeActor("editor"), await makeActor("scientist")];
  const recordId = await makeRecord(editor);
  const measurementId = await makeMeasurement(editor, recordId);
  const other = await makeMeasurement(editor, recordId, { printed: "128.93 ± 0.55" });
  const adoption = parseInput(AdoptParallax, { recordId, version: 1, measurementId, reason: "Newest" });
  await Promise.all([adoptParallax(editor, adoption), adoptParallax(editor, adoption)]);
  await vetRecord(scientist, { recordId, version: 2 });
  await vetRecord(scientist, { recordId, version: 2 });
  const reject = { measurementId: other, version: 1, reason: "Superseded" };
  await rejectMeasurement(scientist, reject);
  await rejectMeasurement(scientist, reject);
  for (const verb of ["adopt-parallax", "vet-record", "reject-measurement"]) {
    expect(await audits(`catalogue.${verb}`, recordId), verb).toHaveLength(1);
  }
});

test("of two people who claim one identifier at once, the second is told who has it", async () => {
  const [mine, yours] = [await makeActor("editor"), await makeActor("editor")];
  const claim = (name: string) =>
    parseInput(CreateRecord, { name, kind: "star", identifiers: "Gaia DR3 4472832130942575872" });
  const done = await Promise.allSettled([createRecord(mine, claim("Mine")), createRecord(yours, claim("Yours"))]);
  const [kept] = done.filter((one) => one.status === "fulfilled");
  const [refused] = done.filter((one) => one.status === "rejected");
  expect(refused?.reason).toMatchObject({
    fields: { identifiers: [expect.stringMatching(/^Gaia DR3 4472832130942575872 is (Mine|Yours)'s already/)] },
    links: [{ to: `/stars/${kept?.value}` }],
  });
});

test("of two who adopt from the same page, the second is refused and nothing of theirs is written", async () => {
  const editor = await makeActor("editor");
  const recordId = await makeRecord(editor);
  const [first, second] = [
    await makeMeasurement(editor, recordId),
    await makeMeasurement(editor, recordId, { printed: "128.93 ± 0.55" }),
  ];
  const adopt = (measurementId: string) =>
    adoptParallax(editor, parseInput(AdoptParallax, { recordId, version: 1, measurementId, reason: "Mine" }));
  await adopt(first);
  await expect(adopt(second)).rejects.toBeInstanceOf(Conflict);
  const [row] = await db().select().from(record).where(eq(record.id, recordId));
  expect(row).toMatchObject({ adoptedParallaxId: first, version: 2 });
  const [kept] = await db().select().from(measurement).where(eq(measurement.id, first));
  expect(kept?.state).toBe("proposed");
});

test("a vetted record whose names are saved from an old page stays vetted", async () => {
  const [editor, scientist] = [await makeActor("editor"), await makeActor("scientist")];
  const { recordId } = await makeVettedStar(editor, scientist);
  const old = parseInput(EditRecord, { recordId, version: "2", name: "Old page", kind: "star" });
  await expect(editRecord(editor, old)).rejects.toBeInstanceOf(Conflict);
  const [row] = await db().select().from(record).where(eq(record.id, recordId));
  expect(row?.state).toBe("vetted");
});
