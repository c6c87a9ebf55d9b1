import { eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { newId } from "#app/database/new-id.ts";
import { exhibit, scene } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import { SceneDocument } from "#app/scene/document.ts";
import type { AddScene } from "./exhibit-input.ts";
import { noteContributor, openExhibit } from "./open-exhibit.server.ts";

/** A new scene at the end of the exhibit, with the document's defaults. */
export async function addScene(actor: Actor | null, input: z.output<typeof AddScene>): Promise<string> {
  authorise(actor, "exhibit.write");
  return change(actor, "exhibit.add-scene", async (c) => {
    const found = await openExhibit(c, input.exhibitId);
    // Counting the exhibit's version up also makes two additions at once wait for each other: no position twice.
    await c.tx
      .update(exhibit)
      .set({ version: sql`${exhibit.version} + 1` })
      .where(eq(exhibit.id, found.id));
    const [last] = await c.tx
      .select({ position: sql<number | null>`max(${scene.position})` })
      .from(scene)
      .where(eq(scene.exhibitId, found.id));
    const added = {
      id: newId(),
      exhibitId: found.id,
      position: Number(last?.position ?? 0) + 1,
      titleEn: input.titleEn,
      titleFr: input.titleFr,
      document: SceneDocument.parse({ kind: "volume" }),
    };
    await c.tx.insert(scene).values(added);
    await noteContributor(c, found.id);
    c.audit({
      objectType: "exhibit",
      objectId: found.id,
      objectName: `${found.titleEn} / ${input.titleEn}`,
      after: added,
    });
    c.touch({ type: "exhibit", id: found.id });
    return added.id;
  });
}
