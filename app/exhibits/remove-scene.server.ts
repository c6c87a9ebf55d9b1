import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { scene, sceneCast, sceneFigure, sceneWords } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import type { RemoveScene } from "./exhibit-input.ts";
import { noteContributor, openScene } from "./open-exhibit.server.ts";

/** Takes a scene out of an exhibit. What was published of it stays in its editions; the audit row keeps its words. */
export async function removeScene(actor: Actor | null, input: z.output<typeof RemoveScene>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.remove-scene", async (c) => {
    const opened = await openScene(c, input.sceneId);
    await compareAndSet(c.tx, scene, opened.scene.id, input.version, {});
    const words = await c.tx.select().from(sceneWords).where(eq(sceneWords.sceneId, opened.scene.id));
    const cast = await c.tx.select().from(sceneCast).where(eq(sceneCast.sceneId, opened.scene.id));
    const figures = await c.tx.select().from(sceneFigure).where(eq(sceneFigure.sceneId, opened.scene.id));
    for (const table of [sceneWords, sceneFigure, sceneCast]) {
      await c.tx.delete(table).where(eq(table.sceneId, opened.scene.id));
    }
    await c.tx.delete(scene).where(eq(scene.id, opened.scene.id));
    await noteContributor(c, opened.exhibit.id);
    c.audit({
      objectType: "exhibit",
      objectId: opened.exhibit.id,
      objectName: `${opened.exhibit.titleEn} / ${opened.scene.titleEn}`,
      before: { ...opened.scene, words, cast, figures },
      after: null,
    });
    c.touch({ type: "exhibit", id: opened.exhibit.id });
  });
}
