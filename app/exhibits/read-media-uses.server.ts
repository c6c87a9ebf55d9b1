import { asc, count, eq, isNotNull } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { exhibit, scene } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";

/** The scenes that show a picture. */
export async function readMediaUses(actor: Actor | null, mediaId: string) {
  authorise(actor, "exhibit.read");
  return db()
    .select({
      exhibitId: exhibit.id,
      exhibit: exhibit.titleEn,
      state: exhibit.state,
      sceneId: scene.id,
      scene: scene.titleEn,
    })
    .from(scene)
    .innerJoin(exhibit, eq(exhibit.id, scene.exhibitId))
    .where(eq(scene.mediaId, mediaId))
    .orderBy(asc(exhibit.titleEn), asc(scene.position));
}

/** How many scenes show each picture; a picture that none shows is not named. */
export async function countMediaUses(actor: Actor | null): Promise<Record<string, number>> {
  authorise(actor, "exhibit.read");
  const rows = await db()
    .select({ mediaId: scene.mediaId, scenes: count() })
    .from(scene)
    .where(isNotNull(scene.mediaId))
    .groupBy(scene.mediaId);
  return Object.fromEntries(rows.map((row) => [row.mediaId ?? "", row.scenes]));
}
