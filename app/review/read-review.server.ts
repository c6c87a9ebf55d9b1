import { desc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { person } from "#app/database/schema/people.ts";
import { seal } from "#app/database/schema/review.ts";
import { NotFound } from "#app/errors.ts";
import { checkContent } from "#app/exhibits/checks.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { mayDo } from "#app/people/permissions.ts";
import { sealable } from "./digest.server.ts";
import { readContributors } from "./signers.server.ts";
import type { VoidReason } from "./void-seals.server.ts";
import { STEPS, stepsFrom } from "./workflow.ts";

/** An exhibit as it is to be signed: resolved content, its digest, what blocks, who signed what. @throws NotFound */
export async function readReview(actor: Actor | null, exhibitId: string) {
  authorise(actor, "review.read");
  const [found] = await db().select().from(exhibit).where(eq(exhibit.id, exhibitId));
  if (!found) throw new NotFound("There is no such exhibit.");
  const [content, contributors, seals] = await Promise.all([
    resolveExhibit(db(), exhibitId),
    readContributors(db(), exhibitId),
    readSeals(exhibitId),
  ]);
  const mine = new Set(contributors.map((one) => one.personId));
  const signedStanding = seals.some((one) => one.voidedAt === null && one.personId === actor.personId);
  return {
    exhibit: { ...found, createdAt: found.createdAt.toISOString() },
    content,
    digest: sealable(content).digest,
    checks: checkContent(content),
    contributors: contributors.map((one) => one.name),
    isOwnWork: mine.has(actor.personId),
    hasSigned: signedStanding,
    seals,
    steps: stepsFrom(found.state).filter((step) => mayDo(actor.roles, STEPS[step].permission)),
  };
}

async function readSeals(exhibitId: string) {
  const rows = await db()
    .select({
      id: seal.id,
      kind: seal.kind,
      digest: seal.digest,
      personId: seal.personId,
      personName: person.name,
      signedAt: seal.signedAt,
      note: seal.note,
      voidedAt: seal.voidedAt,
      voidReason: seal.voidReason,
    })
    .from(seal)
    .innerJoin(person, eq(person.id, seal.personId))
    .where(eq(seal.exhibitId, exhibitId))
    .orderBy(desc(seal.id))
    .limit(30);
  return rows.map((row) => ({
    ...row,
    signedAt: row.signedAt.toISOString(),
    voidedAt: row.voidedAt?.toISOString() ?? null,
    voidReason: row.voidReason as VoidReason | null,
  }));
}
