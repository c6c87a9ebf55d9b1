import { asc, eq } from "drizzle-orm";
import { expect, test } from "vitest";
import "#app/review/register.server.ts";
import { db } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { exhibit, exhibitContributor, scene } from "#app/database/schema/exhibits.ts";
import { Conflict, Forbidden, Invalid, Locked } from "#app/errors.ts";
import { makeMeasurement, makeRecord, makeVettedStar } from "#tests/factories/catalogue.ts";
import { makeExhibit } from "#tests/factories/exhibit.ts";
import { makeActor } from "#tests/factories/person.ts";
import { addScene } from "./add-scene.server.ts";
import { addToCast } from "./add-to-cast.server.ts";
import { bindFigure } from "./bind-figure.server.ts";
import { checkContent } from "./checks.ts";
import { createExhibit } from "./create-exhibit.server.ts";
import { labelCast } from "./label-cast.server.ts";
import { orderCast } from "./order-cast.server.ts";
import { orderScenes } from "./order-scenes.server.ts";
import { removeFromCast } from "./remove-from-cast.server.ts";
import { removeScene } from "./remove-scene.server.ts";
import { renameExhibit } from "./rename-exhibit.server.ts";
import { resolveExhibit } from "./resolve-exhibit.server.ts";
import { saveWords } from "./save-words.server.ts";
import { unbindFigure } from "./unbind-figure.server.ts";

const built = async () => {
  const editor = await makeActor("editor");
  const scientist = await makeActor("scientist");
  return { editor, scientist, ...(await makeExhibit(editor, scientist)) };
};
const versionOf = async (id: string) => (await db().select().from(exhibit).where(eq(exhibit.id, id)))[0]?.version ?? 0;
const content = (id: string) => resolveExhibit(db(), id);

test("words are resolved with their figures, in every language the exhibit has", async () => {
  const { exhibitId, editor, sceneId, sceneVersion } = await built();
  expect((await content(exhibitId)).languages).toEqual(["en"]);
  await renameExhibit(editor, {
    exhibitId,
    version: await versionOf(exhibitId),
    titleEn: "How far",
    titleFr: "À quelle distance",
  });
  await saveWords(editor, { sceneId, version: sceneVersion, en: "It is {star} away.", fr: "Elle est à {star}." });
  const { languages, scenes } = await content(exhibitId);
  expect(languages).toEqual(["en", "fr"]);
  expect(scenes[0]?.figures.star?.fr?.text).toBe("25,04\u00a0années-lumière");
  expect(scenes[0]?.words.fr).toEqual([[{ text: "Elle est à " }, { figure: "star" }, { text: "." }]]);
});

test("words that name a figure which is not bound are refused at their language", async () => {
  const { editor, sceneId, sceneVersion } = await built();
  const input = { sceneId, version: sceneVersion, en: "It is {star} away.", fr: "Elle est à {etoile}." };
  await expect(saveWords(editor, input)).rejects.toMatchObject({
    fields: { fr: [expect.stringContaining("{etoile}")] },
  });
});

test("a figure stays bound while the words name it", async () => {
  const { editor, sceneId, sceneVersion } = await built();
  await expect(unbindFigure(editor, { sceneId, version: sceneVersion, key: "star" })).rejects.toBeInstanceOf(Locked);
  await saveWords(editor, { sceneId, version: sceneVersion, en: "It is far away.", fr: "" });
  await unbindFigure(editor, { sceneId, version: sceneVersion + 1, key: "star" });
});

test("two people who save one scene: the second is told, and the first is kept", async () => {
  const { exhibitId, editor, sceneId, sceneVersion } = await built();
  await saveWords(editor, { sceneId, version: sceneVersion, en: "First {star}.", fr: "" });
  const second = { sceneId, version: sceneVersion, en: "Second {star}.", fr: "" };
  await expect(saveWords(await makeActor("editor"), second)).rejects.toBeInstanceOf(Conflict);
  expect((await content(exhibitId)).scenes[0]?.words.en[0]?.[0]).toEqual({ text: "First " });
});

test("scenes and cast are put in order, and only in an order of what is there", async () => {
  const { exhibitId, editor, scientist, sceneId, star } = await built();
  const other = await addScene(editor, { exhibitId, titleEn: "Second", titleFr: null });
  const version = await versionOf(exhibitId);
  await orderScenes(editor, { exhibitId, version, order: [other, sceneId] });
  const rows = await db().select().from(scene).where(eq(scene.exhibitId, exhibitId)).orderBy(asc(scene.position));
  expect(rows.map((row) => row.id)).toEqual([other, sceneId]);
  await expect(orderScenes(editor, { exhibitId, version: version + 1, order: [other] })).rejects.toBeInstanceOf(
    Conflict,
  );
  const second = await makeVettedStar(editor, scientist);
  await addToCast(editor, { sceneId, version: 4, recordId: [second.recordId] });
  await orderCast(editor, { sceneId, version: 5, order: [second.recordId, star.recordId] });
  const cast = (await content(exhibitId)).scenes[1]?.cast.map((member) => member.recordId);
  expect(cast).toEqual([second.recordId, star.recordId]);
});

test("adding twice adds once; names are hidden, members leave, scenes go", async () => {
  const { exhibitId, editor, sceneId, star, sceneVersion } = await built();
  await addToCast(editor, { sceneId, version: sceneVersion, recordId: [star.recordId, star.recordId] });
  expect((await content(exhibitId)).scenes[0]?.cast).toHaveLength(1);
  await labelCast(editor, { sceneId, version: sceneVersion, recordId: star.recordId, labelled: false });
  expect((await content(exhibitId)).scenes[0]?.cast[0]?.labelled).toBe(false);
  await removeFromCast(editor, { sceneId, version: sceneVersion + 1, recordId: star.recordId });
  expect((await content(exhibitId)).scenes[0]?.cast).toEqual([]);
  await removeScene(editor, { sceneId, version: sceneVersion + 2 });
  expect((await content(exhibitId)).scenes).toEqual([]);
  const kept = await db().select().from(auditEntry).where(eq(auditEntry.objectId, exhibitId));
  expect(JSON.stringify(kept.map((row) => row.before))).toContain("This star is {star} away.");
});

test("records and addresses that do not fit are refused at their field", async () => {
  const { editor, sceneId, sceneVersion, slug } = await built();
  await expect(addToCast(editor, { sceneId, version: sceneVersion, recordId: ["nobody"] })).rejects.toBeInstanceOf(
    Invalid,
  );
  await expect(createExhibit(editor, { titleEn: "T", titleFr: null, slug })).rejects.toMatchObject({
    fields: { slug: [expect.any(String)] },
  });
});

test("everybody whose hand is in an exhibit is written down as such", async () => {
  const { exhibitId, editor, sceneId, sceneVersion } = await built();
  const second = await makeActor("editor");
  await saveWords(second, { sceneId, version: sceneVersion, en: "Mine {star}.", fr: "" });
  const hands = await db().select().from(exhibitContributor).where(eq(exhibitContributor.exhibitId, exhibitId));
  expect(hands.map((row) => row.personId).sort()).toEqual([editor.personId, second.personId].sort());
});

test("the checks tell what blocks and what deserves a look", async () => {
  const editor = await makeActor("editor");
  const { exhibitId, sceneId, sceneVersion } = await makeExhibit(editor, await makeActor("scientist"));
  expect(checkContent(await content(exhibitId))).toEqual([]);
  const bare = await makeRecord(editor, { name: "Bare" });
  await addToCast(editor, { sceneId, version: sceneVersion, recordId: [bare] });
  await saveWords(editor, { sceneId, version: sceneVersion + 1, en: "It is {star} away, not 30 light-years.", fr: "" });
  await bindFigure(editor, {
    sceneId,
    version: sceneVersion + 2,
    key: "idle",
    recordId: bare,
    quantity: "distance",
    unit: "ly",
    form: "value",
  });
  const said = checkContent(await content(exhibitId)).map((check) => `${check.level}: ${check.message}`);
  expect(said).toEqual([
    "blocks: Bare is not vetted.",
    "blocks: Bare has no distance that may be shown: adopt a parallax, or choose a prior.",
    "warns: “30 light-years” is typed by hand next to a unit: bind it to a record.",
    "warns: The figure {idle} is bound but the words do not use it.",
  ]);
});

test("a figure of a prior-led parallax cannot be said without a prior, and says why", async () => {
  const { exhibitId, editor, sceneId, sceneVersion } = await built();
  const recordId = await makeRecord(editor);
  await makeMeasurement(editor, recordId, { printed: "0.5 ± 1.0" });
  await bindFigure(editor, {
    sceneId,
    version: sceneVersion,
    key: "far",
    recordId,
    quantity: "distance",
    unit: "ly",
    form: "value",
  });
  expect((await content(exhibitId)).scenes[0]?.figures.far).toMatchObject({
    en: null,
    reason: expect.stringContaining("no adopted parallax"),
  });
});

test("scientists, publishers and administrators build no exhibits", async () => {
  const { sceneId, sceneVersion } = await built();
  for (const role of ["scientist", "publisher", "admin"] as const) {
    await expect(
      saveWords(await makeActor(role), { sceneId, version: sceneVersion, en: "", fr: "" }),
    ).rejects.toBeInstanceOf(Forbidden);
  }
});
