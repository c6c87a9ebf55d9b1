import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { makeRecord } from "#tests/factories/catalogue.ts";
import { makeActor } from "#tests/factories/person.ts";
import { type RecordQuery, readRecords } from "./read-records.server.ts";

const QUERY: RecordQuery = { search: "", state: null, sort: "name", descending: false, after: null, before: null };

async function walk(actor: Awaited<ReturnType<typeof makeActor>>, query: RecordQuery, way: "next" | "previous") {
  const seen: string[] = [];
  let at: RecordQuery | null = query;
  while (at) {
    const page: Awaited<ReturnType<typeof readRecords>> = await readRecords(actor, at);
    const ids = page.rows.map((row) => row.id);
    seen.push(...(way === "next" ? ids : ids.reverse()));
    if (way === "next") at = page.next ? { ...query, after: page.next } : null;
    else at = page.previous ? { ...query, before: page.previous } : null;
  }
  return seen;
}

test.each(["name", "distance"] as const)(
  "pages by %s show every record once, forwards and backwards, ties and missing distances too",
  async (sort) => {
    const editor = await makeActor("editor");
    const mark = `Page ${newId()}`;
    const rows = Array.from({ length: 123 }, (_, at) => ({
      id: newId(),
      name: `${mark} ${at % 40}`,
      kind: "star" as const,
      distancePc: at % 3 === 0 ? null : (at % 7) + 1 / 3,
      createdBy: editor.personId,
    }));
    await db().insert(record).values(rows);
    for (const descending of [false, true]) {
      const query = { ...QUERY, search: mark, sort, descending };
      const forwards = await walk(editor, query, "next");
      expect(forwards).toHaveLength(rows.length);
      expect(new Set(forwards)).toEqual(new Set(rows.map((row) => row.id)));
      const last = rows.find((row) => row.id === forwards.at(-1));
      const end =
        sort === "name" ? `${last?.name}~${last?.id}` : `${last?.distancePc ?? (descending ? -1 : 1e30)}~${last?.id}`;
      if (sort === "distance") expect(last?.distancePc).toBeNull();
      const backwards = await walk(editor, { ...query, before: end }, "previous");
      expect(backwards).toEqual(forwards.slice(0, -1).reverse());
    }
  },
);

test("a search finds any name and any identifier, and an identifier only in its own catalogue", async () => {
  const editor = await makeActor("editor");
  const names = { name: "Zubenel", otherNames: "fr: Zubénel\nα2 Librae", identifiers: "HIP 72622; HD 130841" };
  const id = await makeRecord(editor, names);
  const find = async (search: string) => (await readRecords(editor, { ...QUERY, search })).rows.map((row) => row.id);
  for (const search of ["zuben", "Zubénel", "α2", "hip072622", "HIP 72622", "72622"]) {
    expect(await find(search), search).toEqual([id]);
  }
  expect(await find("HD 72622")).toEqual([]);
  expect(await find("100%")).toEqual([]);
  expect(await find("_ubenel")).toEqual([]);
});

test("a page address that was tampered with shows a page, not an error", async () => {
  const editor = await makeActor("editor");
  await makeRecord(editor);
  for (const after of ["~", "x", "NaN~x", "~~~", "'~'"]) {
    for (const sort of ["name", "distance"] as const) {
      expect((await readRecords(editor, { ...QUERY, sort, after })).total).toBeGreaterThan(0);
    }
  }
});
