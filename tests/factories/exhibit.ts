import type { Actor } from "#app/audit/actor.ts";
import { newId } from "#app/database/new-id.ts";
import { addScene } from "#app/exhibits/add-scene.server.ts";
import { addToCast } from "#app/exhibits/add-to-cast.server.ts";
import { bindFigure } from "#app/exhibits/bind-figure.server.ts";
import { createExhibit } from "#app/exhibits/create-exhibit.server.ts";
import { saveWords } from "#app/exhibits/save-words.server.ts";
import { makeVettedStar } from "./catalogue.ts";

/** An exhibit of one scene with one vetted star and one bound figure, ready to submit. Scene version is 4. */
export async function makeExhibit(editor: Actor, scientist: Actor) {
  const star = await makeVettedStar(editor, scientist);
  const slug = `exhibit-${newId().toLowerCase()}`;
  const exhibitId = await createExhibit(editor, { titleEn: "How far", titleFr: null, slug });
  const sceneId = await addScene(editor, { exhibitId, titleEn: "One star", titleFr: null });
  await addToCast(editor, { sceneId, version: 1, recordId: [star.recordId] });
  await bindFigure(editor, {
    sceneId,
    version: 2,
    key: "star",
    recordId: star.recordId,
    quantity: "distance",
    unit: "ly",
    form: "value",
  });
  await saveWords(editor, { sceneId, version: 3, en: "This star is {star} away.", fr: "" });
  return { exhibitId, slug, sceneId, sceneVersion: 4, star };
}
