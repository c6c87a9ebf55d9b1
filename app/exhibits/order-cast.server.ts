import { and, asc, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { sceneCast } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import type { OrderCast } from "./exhibit-input.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";
import { assertSameMembers } from "./order.ts";

export async function orderCast(actor: Actor | null, input: z.output<typeof OrderCast>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.order-cast", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const rows = await c.tx
      .select({ recordId: sceneCast.recordId, name: record.name })
      .from(sceneCast)
      .innerJoin(record, eq(record.id, sceneCast.recordId))
      .where(eq(sceneCast.sceneId, opened.scene.id))
      .orderBy(asc(sceneCast.position));
    const before = rows.map((row) => row.recordId);
    assertSameMembers(before, input.order);
    if (before.every((id, at) => id === input.order[at])) return c.unchanged();
    for (const [at, recordId] of input.order.entries()) {
      await c.tx
        .update(sceneCast)
        .set({ position: at + 1 })
        .where(and(eq(sceneCast.sceneId, opened.scene.id), eq(sceneCast.recordId, recordId)));
    }
    const name = (id: string) => rows.find((row) => row.recordId === id)?.name;
    const states = { before: { cast: before.map(name) }, after: { cast: input.order.map(name) } };
    await closeScene(c, opened, input.version, {}, states);
  });
}
