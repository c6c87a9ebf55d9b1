import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { sceneCast } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import type { RemoveFromCast } from "./exhibit-input.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";

export async function removeFromCast(actor: Actor | null, input: z.output<typeof RemoveFromCast>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.remove-from-cast", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const [member] = await c.tx.select({ name: record.name }).from(record).where(eq(record.id, input.recordId));
    const [gone] = await c.tx
      .delete(sceneCast)
      .where(and(eq(sceneCast.sceneId, opened.scene.id), eq(sceneCast.recordId, input.recordId)));
    if (gone.affectedRows === 0) return c.unchanged();
    await closeScene(c, opened, input.version, {}, { before: { cast: [member?.name] }, after: null });
  });
}
