import { desc, eq } from "drizzle-orm";
import { db } from "#app/database/db.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { NotFound } from "#app/errors.ts";
import type { ExhibitContent } from "#app/exhibits/content.ts";

export interface LiveEdition {
  exhibitId: string;
  number: number;
  digest: string;
  publishedAt: Date;
  content: ExhibitContent;
  stills: Record<string, string>;
}

/** The newest edition of an exhibit, for feed and kiosk; public. @throws NotFound when nothing was published. */
export async function readNewestEdition(slug: string): Promise<LiveEdition> {
  const [found] = await db()
    .select({ edition })
    .from(edition)
    .innerJoin(exhibit, eq(exhibit.id, edition.exhibitId))
    .where(eq(exhibit.slug, slug))
    .orderBy(desc(edition.number))
    .limit(1);
  if (!found) throw new NotFound("Nothing is published under this name.");
  const { exhibitId, number, digest, publishedAt, content, stills } = found.edition;
  return {
    exhibitId,
    number,
    digest,
    publishedAt,
    stills,
    content: JSON.parse(content.toString("utf8")) as ExhibitContent,
  };
}
