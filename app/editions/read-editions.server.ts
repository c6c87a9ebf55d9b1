import { desc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { person } from "#app/database/schema/people.ts";
import { NotFound } from "#app/errors.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { sealable } from "#app/review/digest.server.ts";
import { readContributors, readStandingSeals } from "#app/review/signers.server.ts";

const columns = {
  id: edition.id,
  exhibitId: edition.exhibitId,
  exhibit: exhibit.titleEn,
  slug: exhibit.slug,
  number: edition.number,
  digest: edition.digest,
  note: edition.note,
  publishedAt: edition.publishedAt,
  publishedBy: person.name,
};

function list() {
  return db()
    .select(columns)
    .from(edition)
    .innerJoin(exhibit, eq(exhibit.id, edition.exhibitId))
    .innerJoin(person, eq(person.id, edition.publishedBy))
    .orderBy(desc(edition.publishedAt), desc(edition.number))
    .$dynamic();
}

const dated = <T extends { publishedAt: Date }>(row: T) => ({ ...row, publishedAt: row.publishedAt.toISOString() });

/** Every edition, newest first. */
export async function readEditions(actor: Actor | null) {
  authorise(actor, "edition.read");
  return (await list().limit(500)).map(dated);
}

/** One exhibit's editions, and whether the next one can be published now. @throws NotFound */
export async function readExhibitEditions(actor: Actor | null, exhibitId: string) {
  authorise(actor, "edition.read");
  const [found] = await db().select().from(exhibit).where(eq(exhibit.id, exhibitId));
  if (!found) throw new NotFound("There is no such exhibit.");
  const [editions, seals, contributors, kiosks, content] = await Promise.all([
    list().where(eq(edition.exhibitId, exhibitId)),
    readStandingSeals(db(), exhibitId),
    readContributors(db(), exhibitId),
    db().select({ id: kiosk.id, name: kiosk.name, slug: kiosk.slug }).from(kiosk).where(eq(kiosk.exhibitId, exhibitId)),
    resolveExhibit(db(), exhibitId),
  ]);
  const approved = seals.find((one) => one.kind === "approved");
  const { digest } = sealable(content);
  return {
    exhibit: { id: found.id, slug: found.slug, titleEn: found.titleEn, state: found.state, version: found.version },
    editions: editions.map(dated),
    kiosks,
    digest,
    isApproved: approved?.digest === digest,
    isPublished: editions[0]?.digest === digest,
    isOwnWork: contributors.some((one) => one.personId === actor.personId),
  };
}
