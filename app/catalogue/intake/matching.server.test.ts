import { and, eq } from "drizzle-orm";
import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { intake, measurement, record, recordIdentifier } from "#app/database/schema/catalogue.ts";
import { Conflict, Invalid, Locked } from "#app/errors.ts";
import { makeRecord, makeSource } from "#tests/factories/catalogue.ts";
import { apply, dryRun, map, named, upload } from "#tests/factories/intake.ts";
import { makeActor } from "#tests/factories/person.ts";
import { abandonIntake } from "./abandon-intake.server.ts";
import { applyIntake } from "./apply-intake.server.ts";
import { readIntake } from "./read-intakes.server.ts";

const hip = () => 100_000 + (Number.parseInt(newId().slice(-4), 36) % 800_000);
const HEAD = "name,ra,dec,parallax,parallax_error";

test("a record that gets measurements has an audit row of its own, and keeps what it had", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const recordId = await makeRecord(editor, { name });
  const { intakeId } = await upload(editor, `${HEAD}\n${name},279.2341,38.783,130.2,0.4\n`);
  await map(editor, intakeId);
  expect(await apply(editor, intakeId)).toEqual({ created: 0, updated: 1, same: 0, bad: 0 });
  const where = and(eq(auditEntry.objectId, recordId), eq(auditEntry.verb, "intake.apply"));
  const [entry] = await db().select().from(auditEntry).where(where);
  expect(entry).toMatchObject({ objectName: name, note: "Row 1 of an intake" });
  expect(JSON.stringify(entry?.after)).toContain("130.2 ± 0.4");
  const [kept] = await db().select().from(record).where(eq(record.id, recordId));
  expect(kept).toMatchObject({ raText: "279.23410832", version: 1, adoptedParallaxId: null });
});

test("the name of another star is not taken for the star itself", async () => {
  const editor = await makeActor("editor");
  const [elsewhere, other, twins] = [named(), named(), named()];
  const [own, row] = [hip(), hip()];
  await makeRecord(editor, { name: elsewhere });
  await makeRecord(editor, { name: other, identifiers: `HIP ${own}` });
  await makeRecord(editor, { name: twins });
  await makeRecord(editor, { name: twins });
  const rows = [`${elsewhere},,10,10,5,0.1`, `${other},${row},,,5,0.1`, `${twins},,,,5,0.1`];
  const { intakeId } = await upload(editor, `name,HIP,ra,dec,parallax,parallax_error\n${rows.join("\n")}\n`);
  await map(editor, intakeId);
  const run = await dryRun(editor, intakeId);
  expect(run).toMatchObject({ created: 0, updated: 0, same: 0, bad: 3 });
  expect(run?.problems.rows.map(({ row: at, column, reason }) => [at, column, reason])).toEqual([
    [1, "name", expect.stringContaining("at another place in the sky")],
    [2, "name", expect.stringContaining(`it is HIP ${own}`)],
    [3, "name", expect.stringContaining("More than one record")],
  ]);
});

test("a row whose identifiers belong to two stars, and two rows of one star, are told", async () => {
  const editor = await makeActor("editor");
  const [a, b] = [named(), named()];
  const [one, two] = [hip(), hip()];
  await makeRecord(editor, { name: a, identifiers: `HIP ${one}` });
  await makeRecord(editor, { name: b, identifiers: `HD ${two}` });
  const rows = [`${named()},${one},${two},5,0.1`, `${named()},${one + 1},${two},5,0.1`, `${b},,,5.1,0.1`];
  const { intakeId } = await upload(editor, `name,HIP,HD,parallax,parallax_error\n${rows.join("\n")}\n`);
  await map(editor, intakeId);
  expect((await dryRun(editor, intakeId))?.problems.rows).toMatchObject([
    { row: 1, column: "HD", value: String(two), reason: `HIP ${one} is ${a}, HD ${two} is ${b}: a row is one star.` },
    { row: 2, column: "HD", reason: "It stands in row 1 already." },
  ]);
  const more = await upload(editor, `name,HD,parallax,parallax_error\n${named()},${two},5,0.1\n${b},,5.1,0.1\n`);
  await map(editor, more.intakeId);
  expect((await dryRun(editor, more.intakeId))?.problems.rows).toMatchObject([
    { row: 2, column: "name", reason: `It is ${b}, as row 1 is already.` },
  ]);
});

test("numbered names of one table are not those of another; the same table under another name is the same", async () => {
  const editor = await makeActor("editor");
  const namePrefix = named();
  const sourceId = await makeSource(editor);
  const take = async (text: string) => {
    const { intakeId } = await upload(editor, text);
    await map(editor, intakeId, { namePrefix, sourceId });
    return intakeId;
  };
  const head = `# ${namePrefix}\n`;
  await apply(editor, await take(`${head}ra,dec,parallax,parallax_error\n10,10,5,0.1\n11,11,6,0.1\n`));
  const again = await take(`${head}# sent again\nra,dec,parallax,parallax_error\n10,10,5,0.1\n11,11,6,0.1\n`);
  expect(await dryRun(editor, again)).toMatchObject({ created: 0, same: 2, bad: 0 });
  const other = await take(`${head}ra,dec,parallax,parallax_error\n200,-10,5,0.1\n11,11,6.5,0.1\n`);
  expect(await dryRun(editor, other)).toMatchObject({ created: 0, updated: 1, bad: 1 });
  const blind = await take(`${head}parallax,parallax_error\n5.5,0.1\n6,0.1\n`);
  const run = await dryRun(editor, blind);
  expect(run).toMatchObject({ updated: 0, same: 1, bad: 1 });
  expect(run?.problems.rows[0]?.reason).toMatch(/nothing says that it is the same star/);
});

test("a parallax without an error is taken with a warning and never adopted; an error without a value is bad", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const rows = [`${name} 1,10,10,5.0,null`, `${name} 2,11,11,,0.1`, `${name} 3,12,12,--,NaN`, `${name} 4,,,,`];
  const { intakeId } = await upload(editor, `${HEAD}\n${rows.join("\n")}\n`);
  await map(editor, intakeId, { adopt: "on", adoptReason: "The only ones" });
  const run = await dryRun(editor, intakeId);
  expect(run).toMatchObject({ created: 2, bad: 2 });
  expect(run?.warnings.rows).toMatchObject([{ row: 1, column: "parallax_error", value: "null" }]);
  expect(run?.problems.rows).toMatchObject([
    { row: 2, column: "parallax_error", value: "0.1" },
    { row: 4, column: "" },
  ]);
  await apply(editor, intakeId, true);
  const [kept] = await db()
    .select()
    .from(record)
    .where(eq(record.name, `${name} 1`));
  expect(kept?.adoptedParallaxId).toBeNull();
  const [entered] = await db()
    .select()
    .from(measurement)
    .where(eq(measurement.recordId, kept?.id ?? ""));
  expect(entered).toMatchObject({ rawText: "5.0", error: null, intakeId });
});

test("units that the file gives count: unknown ones are refused at their fields until a person says better", async () => {
  const editor = await makeActor("editor");
  const text = `name,RAJ2000,DEJ2000,Plx,e_Plx\n,rad,deg,furlong,mas\n${named()},1.2,0.3,0.5,0.1\n`;
  const { intakeId } = await upload(editor, text);
  const refused = await map(editor, intakeId).catch((error) => error);
  expect(refused).toBeInstanceOf(Invalid);
  expect(Object.keys(refused.fields).sort()).toEqual(["meaning-1", "unit-3"]);
  expect(refused.fields["unit-3"][0]).toContain("furlong");
  const positionsOut = { "meaning-1": "ignore", "meaning-2": "ignore" };
  const mixed = await map(editor, intakeId, { ...positionsOut, "unit-3": "arcsec" }).catch((error) => error);
  expect(mixed.fields).toHaveProperty("unit-4");
  await map(editor, intakeId, { ...positionsOut, "unit-3": "mas" });
  expect(await dryRun(editor, intakeId)).toMatchObject({ created: 1, bad: 0 });
});

test("positions may be of another epoch than the measurements", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const { intakeId } = await upload(editor, `${HEAD}\n${name},10,10,5,0.1\n`);
  const refused = await map(editor, intakeId, { positionEpoch: "B1950" }).catch((error) => error);
  expect(Object.keys(refused.fields)).toEqual(["positionEpoch"]);
  await map(editor, intakeId, { epoch: "1991.25", positionEpoch: "J2000.0" });
  await apply(editor, intakeId);
  const [kept] = await db().select().from(record).where(eq(record.name, name));
  expect(kept?.positionEpoch).toBe("2000.0");
  const [entered] = await db()
    .select()
    .from(measurement)
    .where(eq(measurement.recordId, kept?.id ?? ""));
  expect(entered?.epoch).toBe("1991.25");
});

test("two tables with the same new star, applied at once, make one record", async () => {
  const editor = await makeActor("editor");
  const number = hip();
  const name = named();
  const tables = await Promise.all(
    [await makeSource(editor), await makeSource(editor)].map(async (sourceId, at) => {
      const { intakeId } = await upload(editor, `name,HIP,parallax,parallax_error\n${name},${number},5.${at},0.1\n`);
      await map(editor, intakeId, { sourceId });
      return intakeId;
    }),
  );
  const counts = await Promise.all(tables.map((intakeId) => apply(editor, intakeId)));
  expect(counts.map((one) => [one.created, one.updated]).sort()).toEqual([
    [0, 1],
    [1, 0],
  ]);
  const [owner, ...more] = await db()
    .select()
    .from(recordIdentifier)
    .where(and(eq(recordIdentifier.catalogue, "HIP"), eq(recordIdentifier.value, String(number))));
  expect(more).toEqual([]);
  const entered = await db()
    .select()
    .from(measurement)
    .where(eq(measurement.recordId, owner?.recordId ?? ""));
  expect(entered.map((one) => one.value).sort()).toEqual(["5.0", "5.1"]);
});

test("the same file sent twice at once is one intake; a given-up one may be sent again, but not applied", async () => {
  const editor = await makeActor("editor");
  const text = `name,parallax,parallax_error\n${named()},5,0.1\n`;
  const sent = await Promise.all([upload(editor, text), upload(editor, text)]);
  const [intakeId = ""] = new Set(sent.map((one) => one.intakeId));
  expect(new Set(sent.map((one) => one.intakeId)).size).toBe(1);
  expect(sent.map((one) => one.alreadySent).sort()).toEqual([false, true]);
  await abandonIntake(editor, { intakeId, version: 1 });
  const refused = await applyIntake(editor, { intakeId, version: 2, goodRowsOnly: false }).catch((error) => error);
  expect(refused).toBeInstanceOf(Locked);
  expect(refused.message).toContain("given up");
  expect((await upload(editor, text)).intakeId).not.toBe(intakeId);
});

test("what is no table leaves nothing behind", async () => {
  const editor = await makeActor("editor");
  const count = async () =>
    (await db().select({ id: intake.id }).from(intake).where(eq(intake.createdBy, editor.personId))).length;
  const bomb = `<?xml version="1.0"?><!DOCTYPE v [<!ENTITY a SYSTEM "file:///etc/hostname">]><VOTABLE>&a;</VOTABLE>`;
  for (const text of [bomb, "", "x".repeat(200_000), "prose, and\nmore of it, in, lines\nwithout end\n".repeat(5000)]) {
    const refused = await upload(editor, text).catch((error) => error);
    expect(refused).toBeInstanceOf(Invalid);
    expect(Object.keys(refused.fields)).toEqual(["file"]);
  }
  expect(await count()).toBe(0);
});

test("bad rows are told a hundred a page, and an address beyond the last page shows the first", async () => {
  const editor = await makeActor("editor");
  const rows = Array.from({ length: 250 }, (_, at) => `${at},nonsense,0.1`);
  const { intakeId } = await upload(editor, `# ${named()}\nname,parallax,parallax_error\n${rows.join("\n")}\n`);
  await map(editor, intakeId);
  const page = async (from: number) => (await readIntake(editor, intakeId, from)).dryRun?.problems;
  expect(await page(0)).toMatchObject({ count: 250, from: 0, previous: null, next: 100 });
  const last = await page(200);
  expect(last).toMatchObject({ from: 200, previous: 100, next: null });
  expect(last?.rows.at(-1)).toMatchObject({ row: 250, value: "nonsense" });
  expect(await page(9000)).toMatchObject({ from: 0 });
});

test("an application that fails at its last step leaves nothing of it behind", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const { intakeId } = await upload(editor, `${HEAD}\n${name},10,10,5,0.1\n`);
  await map(editor, intakeId);
  // The version is compared when everything else has been written.
  await expect(applyIntake(editor, { intakeId, version: 1, goodRowsOnly: false })).rejects.toBeInstanceOf(Conflict);
  expect(await db().select().from(record).where(eq(record.name, name))).toEqual([]);
  expect(await db().select().from(measurement).where(eq(measurement.intakeId, intakeId))).toEqual([]);
  expect((await readIntake(editor, intakeId)).intake).toMatchObject({ state: "uploaded", createdCount: 0 });
  expect(await apply(editor, intakeId)).toMatchObject({ created: 1 });
});

test("a VOTable goes in by its UCDs and units; nulls of its own are no values", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const number = hip();
  const field = (as: string, more: string, inner = "") => `<FIELD name="${as}" ${more}>${inner}</FIELD>`;
  const fields = [
    field("HIP", 'datatype="int"'),
    field("alpha", 'datatype="double" unit="deg" ucd="pos.eq.ra;meta.main"'),
    field("delta", 'datatype="double" unit="deg" ucd="pos.eq.dec;meta.main"'),
    field("p", 'datatype="double" unit="arcsec" ucd="pos.parallax.trig"', '<VALUES null="-99"/>'),
    field("ep", 'datatype="double" unit="arcsec" ucd="stat.error;pos.parallax.trig"'),
  ];
  const row = (...cells: (string | number)[]) => `<TR>${cells.map((cell) => `<TD>${cell}</TD>`).join("")}</TR>`;
  const rows = row(number, 10, 10, "0.0500", "0.0002") + row(number + 1, 11, 11, -99, "");
  const table = `<TABLE>${fields.join("")}<DATA><TABLEDATA>${rows}</TABLEDATA></DATA></TABLE>`;
  const { intakeId } = await upload(editor, `<VOTABLE version="1.4"><RESOURCE>${table}</RESOURCE></VOTABLE>`);
  await map(editor, intakeId, { namePrefix: name });
  expect(await apply(editor, intakeId)).toEqual({ created: 2, updated: 0, same: 0, bad: 0 });
  const entered = await db().select().from(measurement).where(eq(measurement.intakeId, intakeId));
  expect(entered).toMatchObject([
    { rawText: "0.0500 ± 0.0002", unit: "arcsec", valueCanonical: 50, errorCanonical: 0.2 },
  ]);
});
