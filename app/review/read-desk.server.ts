import { asc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { exhibit, exhibitContributor } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import { mayDo } from "#app/people/permissions.ts";
import { TURN } from "./workflow.ts";

/** What waits for this person: exhibits whose turn is theirs, and records to vet. */
export async function readDesk(actor: Actor | null) {
  authorise(actor, "account.use");
  const [exhibits, hands, drafts] = await Promise.all([
    db()
      .select({ id: exhibit.id, titleEn: exhibit.titleEn, state: exhibit.state })
      .from(exhibit)
      .orderBy(asc(exhibit.titleEn)),
    db().select().from(exhibitContributor).where(eq(exhibitContributor.personId, actor.personId)),
    mayDo(actor.roles, "record.vet")
      ? db()
          .select({ id: record.id, name: record.name })
          .from(record)
          .where(eq(record.state, "draft"))
          .orderBy(asc(record.name))
          .limit(12)
      : [],
  ]);
  const own = new Set(hands.map((row) => row.exhibitId));
  return {
    yours: exhibits.filter((one) => actor.roles.includes(TURN[one.state]) && isForThem(one.state, own.has(one.id))),
    underway: exhibits.filter((one) => one.state !== "draft"),
    toVet: drafts,
  };
}

/** A draft waits for those who work on it; a review waits for anybody but them. */
function isForThem(state: (typeof exhibit.$inferSelect)["state"], own: boolean): boolean {
  return state === "draft" ? own : !own;
}
