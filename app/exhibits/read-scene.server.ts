import { and, asc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { exhibit, scene, sceneFigure, sceneWords } from "#app/database/schema/exhibits.ts";
import { media } from "#app/database/schema/media.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { checkContent } from "./checks.ts";
import { resolveExhibit } from "./resolve-exhibit.server.ts";

/** Everything the builder shows of one scene. @throws NotFound */
export async function readScene(actor: Actor | null, exhibitId: string, sceneId: string) {
  authorise(actor, "exhibit.read");
  const [found] = await db()
    .select()
    .from(scene)
    .innerJoin(exhibit, eq(exhibit.id, scene.exhibitId))
    .where(and(eq(scene.id, sceneId), eq(scene.exhibitId, exhibitId)));
  if (!found) throw new NotFound("There is no such scene in this exhibit.");
  const [content, words, figures, pictures] = await Promise.all([
    resolveExhibit(db(), exhibitId),
    db().select().from(sceneWords).where(eq(sceneWords.sceneId, sceneId)),
    db().select().from(sceneFigure).where(eq(sceneFigure.sceneId, sceneId)).orderBy(asc(sceneFigure.key)),
    db()
      .select({ id: media.id, fileName: media.fileName, creditLine: media.creditLine, altEn: media.altEn })
      .from(media)
      .orderBy(asc(media.fileName)),
  ]);
  const at = content.scenes.findIndex((one) => one.id === sceneId);
  const resolved = content.scenes[at];
  if (!resolved) throw new NotFound("There is no such scene in this exhibit.");
  const body = (language: "en" | "fr") => words.find((row) => row.language === language)?.body ?? "";
  const { id, titleEn, titleFr, state } = found.exhibit;
  return {
    exhibit: { id, titleEn, titleFr, state, languages: content.languages },
    scene: {
      id: found.scene.id,
      version: found.scene.version,
      titleEn: found.scene.titleEn,
      titleFr: found.scene.titleFr,
      mediaId: found.scene.mediaId,
      number: at + 1,
    },
    scenes: content.scenes.map((one) => ({ id: one.id, title: one.title.en })),
    resolved,
    words: { en: body("en"), fr: body("fr") },
    figures: figures.map(({ key, recordId, quantity, unit, form }) => ({ key, recordId, quantity, unit, form })),
    pictures,
    checks: checkContent(content).filter((check) => check.sceneId === sceneId),
  };
}
