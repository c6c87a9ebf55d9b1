import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { NotFound } from "#app/errors.ts";
import { openExhibit } from "#app/exhibits/open-exhibit.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { issueEdition } from "./issue-edition.server.ts";
import type { ReissueEdition } from "./publish-input.ts";

/** Takes the newest edition back by issuing an earlier one again, under a new, higher number. Nothing is altered. */
export async function reissueEdition(actor: Actor | null, input: z.output<typeof ReissueEdition>): Promise<number> {
  authorise(actor, "edition.publish");
  return change(actor, "edition.reissue", async (c) => {
    const found = await openExhibit(c, input.exhibitId);
    const [earlier] = await c.tx
      .select()
      .from(edition)
      .where(and(eq(edition.exhibitId, found.id), eq(edition.number, input.number)));
    if (!earlier) throw new NotFound(`There is no edition ${input.number}.`);
    const { digest, content, stills, sealId } = earlier;
    const note = `Edition ${input.number} again: ${input.note}`.slice(0, 1000);
    return issueEdition(c, found, input.version, { digest, content, stills, sealId, note });
  });
}
