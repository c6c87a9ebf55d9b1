import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { sceneCast } from "#app/database/schema/exhibits.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { LabelCast } from "./exhibit-input.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";

/** Whether a member of the cast carries its name in the picture. */
export async function labelCast(actor: Actor | null, input: z.output<typeof LabelCast>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.label-cast", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const member = and(eq(sceneCast.sceneId, opened.scene.id), eq(sceneCast.recordId, input.recordId));
    const [found] = await c.tx.select().from(sceneCast).where(member);
    if (!found) throw new NotFound("This record is not in the cast.");
    if (found.labelled === input.labelled) return c.unchanged();
    await c.tx.update(sceneCast).set({ labelled: input.labelled }).where(member);
    const states = { before: { labelled: found.labelled }, after: { labelled: input.labelled } };
    await closeScene(c, opened, input.version, {}, states);
  });
}
