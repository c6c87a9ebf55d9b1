import { desc, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { db } from "#app/database/db.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { Conflict, Forbidden } from "#app/errors.ts";
import { openExhibit } from "#app/exhibits/open-exhibit.server.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { sealable } from "#app/review/digest.server.ts";
import { readContributors, readStandingSeals } from "#app/review/signers.server.ts";
import { issueEdition } from "./issue-edition.server.ts";
import type { PublishEdition } from "./publish-input.ts";
import { keepStills } from "./stills.server.ts";

/**
 * Makes the next edition of what was verified and approved, to the byte.
 * @returns its number
 * @throws Conflict when the approved digest is not today's, or the newest edition has it already.
 */
export async function publishEdition(actor: Actor | null, input: z.output<typeof PublishEdition>): Promise<number> {
  authorise(actor, "edition.publish");
  // Drawing takes a while, so it is done before the transaction; what was drawn is checked against the seal inside it.
  const stills = await keepStills(await resolveExhibit(db(), input.exhibitId));
  return change(actor, "edition.publish", async (c) => {
    const found = await openExhibit(c, input.exhibitId);
    await refuseOwnWork(c, actor, found.id);
    const approved = (await readStandingSeals(c.tx, found.id)).find((seal) => seal.kind === "approved");
    const now = sealable(await resolveExhibit(c.tx, found.id));
    if (!approved || approved.digest !== now.digest || now.digest !== input.digest) {
      throw new Conflict("What was approved is not what stands here now. It has to go through review again.");
    }
    const [newest] = await c.tx
      .select({ number: edition.number, digest: edition.digest })
      .from(edition)
      .where(eq(edition.exhibitId, found.id))
      .orderBy(desc(edition.number))
      .limit(1);
    if (newest?.digest === now.digest) throw new Conflict(`Edition ${newest.number} has exactly this content already.`);
    const { digest, content } = approved;
    return issueEdition(c, found, input.version, { digest, content, stills, sealId: approved.id, note: input.note });
  });
}

async function refuseOwnWork(c: Change, actor: Actor, exhibitId: string): Promise<void> {
  const contributors = await readContributors(c.tx, exhibitId);
  if (contributors.some((one) => one.personId === actor.personId)) {
    throw new Forbidden("You have worked on this exhibit yourself, so somebody else has to publish it.");
  }
}
