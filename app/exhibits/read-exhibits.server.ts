import { asc, count, eq, sql } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { exhibit, scene } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";

/** Every exhibit with its state and how many scenes it has. */
export async function readExhibits(actor: Actor | null) {
  authorise(actor, "exhibit.read");
  const rows = await db()
    .select({
      id: exhibit.id,
      slug: exhibit.slug,
      titleEn: exhibit.titleEn,
      titleFr: exhibit.titleFr,
      state: exhibit.state,
      scenes: count(scene.id),
      // editions stands to the right on the shelf; only the newest number is asked for.
      edition: sql<number | null>`(select max(number) from edition where edition.exhibit_id = ${exhibit.id})`,
    })
    .from(exhibit)
    .leftJoin(scene, eq(scene.exhibitId, exhibit.id))
    .groupBy(exhibit.id)
    .orderBy(asc(exhibit.titleEn));
  return rows;
}
