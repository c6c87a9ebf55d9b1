import { asc, eq, max } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";

async function readPublished() {
  return db()
    .select({ exhibitId: exhibit.id, slug: exhibit.slug, title: exhibit.titleEn, edition: max(edition.number) })
    .from(edition)
    .innerJoin(exhibit, eq(exhibit.id, edition.exhibitId))
    .groupBy(exhibit.id, exhibit.slug, exhibit.titleEn)
    .orderBy(asc(exhibit.titleEn));
}

/** Every kiosk with what it shows. */
export async function readKiosks(actor: Actor | null) {
  authorise(actor, "kiosk.read");
  const [kiosks, published] = await Promise.all([db().select().from(kiosk).orderBy(asc(kiosk.name)), readPublished()]);
  return kiosks.map((one) => ({
    ...one,
    createdAt: one.createdAt.toISOString(),
    showing: published.find((exhibit) => exhibit.exhibitId === one.exhibitId) ?? null,
  }));
}

/** One kiosk, and the published exhibits it could show. @throws NotFound */
export async function readKiosk(actor: Actor | null, kioskId: string) {
  authorise(actor, "kiosk.read");
  const [[found], published] = await Promise.all([
    db().select().from(kiosk).where(eq(kiosk.id, kioskId)),
    readPublished(),
  ]);
  if (!found) throw new NotFound("There is no such kiosk.");
  return { kiosk: { ...found, createdAt: found.createdAt.toISOString() }, published };
}
