import { eq } from "drizzle-orm";
import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { source } from "#app/database/schema/catalogue.ts";
import { Conflict, Forbidden, type Invalid, Unauthenticated } from "#app/errors.ts";
import { parseInput } from "#app/parse-input.ts";
import { makeMeasurement, makeRecord, makeSource } from "#tests/factories/catalogue.ts";
import { makeActor } from "#tests/factories/person.ts";
import { createSource } from "./create-source.server.ts";
import { editSource } from "./edit-source.server.ts";
import { readSource, readSources } from "./read-sources.server.ts";
import { CreateSource, EditSource } from "./source-input.ts";

const doi = () => `10.9999/${newId()}`;
const form = (more: object = {}) => ({ title: "A table", authors: "Tern, A.", year: "2020", doi: doi(), ...more });

function fieldsRefused(input: object): string[] {
  try {
    parseInput(CreateSource, { ...input });
  } catch (error) {
    return Object.keys((error as Invalid).fields);
  }
  return [];
}

test("a source needs a title, authors, a year, and a bibcode or a DOI that is one", () => {
  expect(fieldsRefused({})).toEqual(expect.arrayContaining(["title", "authors", "year"]));
  expect(fieldsRefused(form({ doi: "" }))).toEqual(["bibcode"]);
  expect(fieldsRefused(form({ doi: "10.1/x" }))).toEqual(["doi"]);
  expect(fieldsRefused(form({ bibcode: "2007A&A...474..653" }))).toEqual(["bibcode"]);
  expect(fieldsRefused(form({ year: "1399" }))).toEqual(["year"]);
  expect(fieldsRefused(form())).toEqual([]);
});

test("a year that is not the bibcode's is refused at the year", () => {
  expect(fieldsRefused(form({ bibcode: "2007A&A...474..653V", year: "2008" }))).toEqual(["year"]);
  expect(fieldsRefused(form({ bibcode: "2007A%26A...474..653V", year: "2007" }))).toEqual([]);
});

test("nobody, and nobody without the role, keeps or edits a source", async () => {
  const input = parseInput(CreateSource, form());
  await expect(createSource(null, input)).rejects.toBeInstanceOf(Unauthenticated);
  const publisher = await makeActor("publisher");
  await expect(createSource(publisher, input)).rejects.toBeInstanceOf(Forbidden);
  const sourceId = await makeSource(await makeActor("editor"));
  const edit = parseInput(EditSource, { sourceId, version: "1", ...form() });
  await expect(editSource(publisher, edit)).rejects.toBeInstanceOf(Forbidden);
});

test("a publication that is kept already is refused at its code, with the way to it", async () => {
  const [mine, yours] = [await makeActor("editor"), await makeActor("editor")];
  const bibcode = "1997A&A...323L..49P";
  const authors = "Perryman, M. A. C.; Lindegren, L.";
  const kept = await createSource(mine, parseInput(CreateSource, form({ bibcode, year: "1997", authors })));
  await expect(createSource(yours, parseInput(CreateSource, form({ bibcode, year: "1997" })))).rejects.toMatchObject({
    fields: { bibcode: [expect.stringContaining("Perryman et al. 1997")] },
    links: [{ to: `/sources/${kept}` }],
  });
  const other = await makeSource(yours);
  const taking = parseInput(EditSource, { sourceId: other, version: "1", ...form({ bibcode, year: "1997" }) });
  await expect(editSource(yours, taking)).rejects.toMatchObject({ links: [{ to: `/sources/${kept}` }] });
});

test("a source sent twice, one after the other or at once, is kept once and audited once", async () => {
  const editor = await makeActor("editor");
  const first = parseInput(CreateSource, form());
  const ids = [await createSource(editor, first), await createSource(editor, first)];
  expect(new Set(ids).size).toBe(1);
  const second = parseInput(CreateSource, form());
  const atOnce = await Promise.all([createSource(editor, second), createSource(editor, second)]);
  expect(new Set(atOnce).size).toBe(1);
  for (const [id] of [ids, atOnce]) {
    const audited = await db()
      .select()
      .from(auditEntry)
      .where(eq(auditEntry.objectId, id ?? ""));
    expect(audited).toHaveLength(1);
  }
});

test("an edited source counts up; without a change it does not; from an old form it is refused", async () => {
  const editor = await makeActor("editor");
  const input = form();
  const sourceId = await createSource(editor, parseInput(CreateSource, input));
  const edit = (version: number, more: object = {}) =>
    editSource(editor, parseInput(EditSource, { sourceId, version: String(version), ...input, ...more }));
  await edit(1);
  await edit(1, { title: "A better title" });
  await expect(edit(1, { title: "A third title" })).rejects.toBeInstanceOf(Conflict);
  const [row] = await db().select().from(source).where(eq(source.id, sourceId));
  expect(row).toMatchObject({ title: "A better title", version: 2 });
});

test("a source's page names each record that rests on it once; the list counts measurements", async () => {
  const editor = await makeActor("editor");
  const sourceId = await makeSource(editor);
  const recordId = await makeRecord(editor, { positionSourceId: sourceId });
  await makeMeasurement(editor, recordId, { sourceId });
  await makeMeasurement(editor, recordId, { sourceId, printed: "131 ± 2" });
  const page = await readSource(editor, sourceId);
  expect(page.users.map((user) => user.id)).toEqual([recordId]);
  expect((await readSources(editor)).find((one) => one.id === sourceId)?.uses).toBe(2);
});

test("a source that does not exist is refused at its field, in records and in measurements", async () => {
  const editor = await makeActor("editor");
  const gone = newId();
  await expect(makeRecord(editor, { positionSourceId: gone })).rejects.toMatchObject({
    fields: { positionSourceId: ["There is no such source."] },
  });
  const recordId = await makeRecord(editor);
  await expect(makeMeasurement(editor, recordId, { sourceId: gone })).rejects.toMatchObject({
    fields: { sourceId: ["There is no such source."] },
  });
});
