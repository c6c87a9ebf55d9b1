import { asc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { exhibit, scene, sceneCast, sceneFigure } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";

/** Where a record is in the cast, and where its numbers are read in words. */
export async function readUses(actor: Actor | null, recordId: string) {
  authorise(actor, "exhibit.read");
  const where = { exhibitId: exhibit.id, exhibit: exhibit.titleEn, state: exhibit.state, scene: scene.titleEn };
  const [cast, figures] = await Promise.all([
    db()
      .select({ ...where, sceneId: scene.id })
      .from(sceneCast)
      .innerJoin(scene, eq(scene.id, sceneCast.sceneId))
      .innerJoin(exhibit, eq(exhibit.id, scene.exhibitId))
      .where(eq(sceneCast.recordId, recordId))
      .orderBy(asc(exhibit.titleEn), asc(scene.position)),
    db()
      .select({ ...where, sceneId: scene.id, key: sceneFigure.key })
      .from(sceneFigure)
      .innerJoin(scene, eq(scene.id, sceneFigure.sceneId))
      .innerJoin(exhibit, eq(exhibit.id, scene.exhibitId))
      .where(eq(sceneFigure.recordId, recordId))
      .orderBy(asc(exhibit.titleEn), asc(scene.position)),
  ]);
  return [
    ...cast.map((row) => ({ ...row, key: null as string | null })),
    ...figures.map((row) => ({ ...row, key: row.key as string | null })),
  ];
}
