import { eq, max } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { tellContributors } from "#app/review/hand-over.server.ts";

type Issued = Pick<typeof edition.$inferInsert, "digest" | "content" | "stills" | "sealId" | "note">;

/**
 * Writes the next edition of an exhibit: numbered by counting the exhibit's version up in the same transaction, so that
 * two publishers at once cannot both succeed.
 * @throws Conflict when somebody else published or changed the exhibit first.
 */
export async function issueEdition(
  c: Change,
  of: { id: string; titleEn: string },
  seenVersion: number,
  issued: Issued,
): Promise<number> {
  await compareAndSet(c.tx, exhibit, of.id, seenVersion, {});
  const [last] = await c.tx
    .select({ number: max(edition.number) })
    .from(edition)
    .where(eq(edition.exhibitId, of.id));
  const number = (last?.number ?? 0) + 1;
  await c.tx
    .insert(edition)
    .values({ ...issued, exhibitId: of.id, number, publishedBy: c.actor.personId, publishedAt: new Date() });
  c.audit({
    objectType: "exhibit",
    objectId: of.id,
    objectName: of.titleEn,
    before: { edition: number - 1 || null },
    after: { edition: number, digest: issued.digest },
    note: issued.note ?? undefined,
  });
  const about = { exhibitId: of.id, title: of.titleEn };
  await tellContributors(c, about, `Edition ${number}: ${of.titleEn}`, [
    `${c.actor.name} has published edition ${number} of “${of.titleEn}”. Kiosks take it when nobody is touching them.`,
  ]);
  return number;
}
