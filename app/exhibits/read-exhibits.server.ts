import { asc, sql } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";

/** Every exhibit with its state and how many scenes it has. */
export async function readExhibits(actor: Actor | null) {
  authorise(actor, "exhibit.read");
  return db()
    .select({
      id: exhibit.id,
      slug: exhibit.slug,
      titleEn: exhibit.titleEn,
      titleFr: exhibit.titleFr,
      state: exhibit.state,
      scenes: sql<number>`(select count(*) from scene where scene.exhibit_id = ${exhibit.id})`,
      // editions stands to the right on the shelf; only the newest number is asked for.
      edition: sql<number | null>`(select max(number) from edition where edition.exhibit_id = ${exhibit.id})`,
    })
    .from(exhibit)
    .orderBy(asc(exhibit.titleEn));
}
