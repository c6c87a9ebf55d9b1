import { eq } from "drizzle-orm";
import { expect, test } from "vitest";
import "#app/review/register.server.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { measurement, record } from "#app/database/schema/catalogue.ts";
import { Conflict, Forbidden, Invalid, Locked } from "#app/errors.ts";
import { makeSource } from "#tests/factories/catalogue.ts";
import { apply, dryRun, map, named, upload } from "#tests/factories/intake.ts";
import { makeActor } from "#tests/factories/person.ts";
import { applyIntake } from "./apply-intake.server.ts";
import { readIntake } from "./read-intakes.server.ts";
import { saveMapping } from "./save-mapping.server.ts";

test("a table goes in: dry run and application agree, the printed text is kept, parallaxes count if asked", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const { intakeId } = await upload(
    editor,
    `name,ra,dec,parallax,parallax_error\n${name} a,10.5,-00 30 00,7.40,0.240\n${name} b,11,-1,9.08,0.39\n`,
  );
  await map(editor, intakeId, { adopt: "on", adoptReason: "The release's own values" });
  expect(await dryRun(editor, intakeId)).toMatchObject({ created: 2, updated: 0, same: 0, bad: 0 });
  expect(await apply(editor, intakeId)).toEqual({ created: 2, updated: 0, same: 0, bad: 0 });
  const [row] = await db()
    .select()
    .from(record)
    .where(eq(record.name, `${name} a`));
  expect(row).toMatchObject({
    decText: "-00 30 00",
    decDeg: -0.5,
    positionEpoch: "2015.0",
    regime: "firm",
    state: "draft",
  });
  expect(row?.distancePc).toBeCloseTo(1000 / 7.4, 9);
  const [kept] = await db()
    .select()
    .from(measurement)
    .where(eq(measurement.recordId, row?.id ?? ""));
  expect(kept).toMatchObject({
    rawText: "7.40 ± 0.240",
    value: "7.40",
    error: "0.240",
    unit: "mas",
    locator: "row 1, column parallax",
  });
});

test("every bad row is told by row, column, value and reason; nothing is written until it is decided", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const rows = [
    `${name} 1,10,1,5.0,0.1`,
    `${name} 2,400,1,5.0,0.1`,
    `${name} 3,10,1,five,0.1`,
    `${name} 4,10,1,5.0,`,
    `${name} 5,10,1,5.0,-0.1`,
    `${name} 6,10,1`,
    `${name} 1,10,1,5.0,0.1`,
    `${name} 8,10,1,-0.4,0.9`,
    `${name} 9,10,1,"5,0",0.1`,
  ];
  const { intakeId } = await upload(editor, `name,ra,dec,parallax,parallax_error\n${rows.join("\n")}\n`);
  await map(editor, intakeId);
  const run = await dryRun(editor, intakeId);
  expect(run).toMatchObject({ created: 3, bad: 6, notAboveZero: 1 });
  expect(run?.problems.rows.map(({ row, column, value }) => [row, column, value])).toEqual([
    [2, "ra", "400"],
    [3, "parallax", "five"],
    [5, "parallax_error", "-0.1"],
    [6, "", `${name} 6, 10, 1`],
    [7, "name", `${name} 1`],
    [9, "parallax", "5,0"],
  ]);
  expect(run?.warnings.rows).toMatchObject([{ row: 4, column: "parallax_error", value: "" }]);
  await expect(apply(editor, intakeId)).rejects.toBeInstanceOf(Locked);
  expect(
    await db()
      .select()
      .from(record)
      .where(eq(record.name, `${name} 1`)),
  ).toEqual([]);
  expect(await apply(editor, intakeId, true)).toMatchObject({ created: 3, bad: 6 });
});

test("applying twice, also at once, writes once", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const { intakeId } = await upload(editor, `name,parallax,parallax_error\n${name},5,0.1\n`);
  await map(editor, intakeId);
  const { intake } = await readIntake(editor, intakeId);
  const input = { intakeId, version: intake.version, goodRowsOnly: false };
  const outcomes = await Promise.allSettled([applyIntake(editor, input), applyIntake(editor, input)]);
  expect(outcomes.map((one) => one.status).sort()).toEqual(["fulfilled", "rejected"]);
  expect(await db().select().from(record).where(eq(record.name, name))).toHaveLength(1);
  await expect(applyIntake(editor, input)).rejects.toBeInstanceOf(Locked);
});

test("the same file again leads to what became of it; the same rows in another file change nothing", async () => {
  const editor = await makeActor("editor");
  const name = named();
  const sourceId = await makeSource(editor);
  const text = `name,HIP,parallax,parallax_error\n${name},${Number.parseInt(newId().slice(-4), 36) % 900000},5,0.1\n`;
  const first = await upload(editor, text);
  await map(editor, first.intakeId, { sourceId });
  await apply(editor, first.intakeId);
  expect(await upload(editor, text)).toEqual({ intakeId: first.intakeId, alreadySent: true });
  const second = await upload(editor, `${text}\n`.replace("name,", "name,").concat("# again\n"));
  await map(editor, second.intakeId, { sourceId });
  expect(await dryRun(editor, second.intakeId)).toMatchObject({ created: 0, updated: 0, same: 1, bad: 0 });
});

test("a row that is known by its identifier adds its measurement to that record", async () => {
  const editor = await makeActor("editor");
  const hip = 100_000 + (Number.parseInt(newId().slice(-4), 36) % 800_000);
  const one = await upload(editor, `name,HIP,parallax,parallax_error\n${named()},${hip},5.0,0.10\n`);
  await map(editor, one.intakeId);
  await apply(editor, one.intakeId);
  const two = await upload(editor, `name,HIP,parallax,parallax_error\n${named()},HIP ${hip},5.2,0.08\n`);
  await map(editor, two.intakeId);
  expect(await apply(editor, two.intakeId)).toEqual({ created: 0, updated: 1, same: 0, bad: 0 });
});

test("rows without a name are called by the rule a person chooses", async () => {
  const editor = await makeActor("editor");
  const { intakeId } = await upload(
    editor,
    `ra,dec,parallax,parallax_error\n55.1,22.${newId().length},7.4,0.2\n56,${Math.random()},7,0.3\n`,
  );
  const refused = await map(editor, intakeId).catch((error) => error);
  expect(refused).toBeInstanceOf(Invalid);
  expect(Object.keys(refused.fields)).toEqual(["namePrefix"]);
  const prefix = named();
  await map(editor, intakeId, { namePrefix: prefix });
  await apply(editor, intakeId);
  expect(
    await db()
      .select()
      .from(record)
      .where(eq(record.name, `${prefix} 2`)),
  ).toHaveLength(1);
});

test("a mapping that makes no sense is refused at its fields", async () => {
  const editor = await makeActor("editor");
  const { intakeId } = await upload(editor, `name,a,b\n${named()},1,2\n`);
  const fields = async (more: Record<string, string>) => {
    const refusal = await map(editor, intakeId, more).catch((error) => error);
    return Object.keys(refusal.fields ?? {}).sort();
  };
  expect(await fields({})).toEqual([""]);
  expect(await fields({ "meaning-1": "parallax", "unit-1": "mag", sourceId: "", epoch: "" })).toEqual([
    "epoch",
    "sourceId",
    "unit-1",
  ]);
  expect(await fields({ "meaning-1": "parallax", "meaning-2": "parallax" })).toEqual(["meaning-2"]);
  expect(await fields({ "meaning-1": "identifier", "meaning-2": "parallax" })).toEqual(["catalogue-1"]);
  expect(await fields({ "meaning-1": "parallax", adopt: "on" })).toEqual(["adoptReason"]);
});

test("a mapping saved over somebody else's is a conflict, and publishers take no tables in", async () => {
  const editor = await makeActor("editor");
  const { intakeId } = await upload(editor, `name,parallax,parallax_error\n${named()},5,0.1\n`);
  const form = new FormData();
  for (const [name, value] of Object.entries({
    "meaning-0": "name",
    "meaning-1": "parallax",
    "meaning-2": "parallax-error",
    sourceId: await makeSource(editor),
    epoch: "2016.0",
  }))
    form.set(name, value);
  await saveMapping(editor, intakeId, 1, form);
  form.set("epoch", "2015.5");
  await expect(saveMapping(editor, intakeId, 1, form)).rejects.toBeInstanceOf(Conflict);
  await expect(upload(await makeActor("publisher"), "a,b\n1,2\n")).rejects.toBeInstanceOf(Forbidden);
});
