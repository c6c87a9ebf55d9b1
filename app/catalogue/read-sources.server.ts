import { asc, count, eq, or } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { measurement, record, source } from "#app/database/schema/catalogue.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { fullCitation, shortCitation } from "./citation.ts";

const cited = (row: typeof source.$inferSelect) => ({
  ...row,
  createdAt: row.createdAt.toISOString(),
  citation: shortCitation(row),
  full: fullCitation(row),
});

/** Every source with how many measurements cite it. */
export async function readSources(actor: Actor | null) {
  authorise(actor, "catalogue.read");
  const [rows, uses] = await Promise.all([
    db().select().from(source).orderBy(asc(source.authors), asc(source.year)),
    db().select({ sourceId: measurement.sourceId, count: count() }).from(measurement).groupBy(measurement.sourceId),
  ]);
  const usesOf = (id: string) => uses.find((one) => one.sourceId === id)?.count ?? 0;
  return rows.map((row) => ({ ...cited(row), uses: usesOf(row.id) }));
}

/** One source and the records that rest on it. @throws NotFound */
export async function readSource(actor: Actor | null, sourceId: string) {
  authorise(actor, "catalogue.read");
  const [found] = await db().select().from(source).where(eq(source.id, sourceId));
  if (!found) throw new NotFound("There is no such source.");
  const users = await db()
    .selectDistinct({ id: record.id, name: record.name, state: record.state })
    .from(record)
    .leftJoin(measurement, eq(measurement.recordId, record.id))
    .where(or(eq(measurement.sourceId, sourceId), eq(record.positionSourceId, sourceId)))
    .orderBy(asc(record.name))
    .limit(500);
  return { source: cited(found), users };
}
