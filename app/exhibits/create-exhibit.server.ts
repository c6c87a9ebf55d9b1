import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { duplicateKey } from "#app/database/database-error.ts";
import { newId } from "#app/database/new-id.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { CreateExhibit } from "./exhibit-input.ts";
import { noteContributor } from "./open-exhibit.server.ts";

/** @throws Invalid at `slug` when another exhibit has this address. */
export async function createExhibit(actor: Actor | null, input: z.output<typeof CreateExhibit>): Promise<string> {
  authorise(actor, "exhibit.write");
  const exhibitId = newId();
  try {
    await change(actor, "exhibit.create", async (c) => {
      await c.tx.insert(exhibit).values({ id: exhibitId, ...input, createdBy: actor.personId });
      await noteContributor(c, exhibitId);
      c.audit({ objectType: "exhibit", objectId: exhibitId, objectName: input.titleEn, after: input });
    });
  } catch (error) {
    if (duplicateKey(error) !== "exhibit_slug") throw error;
    throw new Invalid({ slug: ["Another exhibit has this address already. Choose another."] });
  }
  return exhibitId;
}
