import { asc, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { exhibit, scene } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import type { OrderScenes } from "./exhibit-input.ts";
import { noteContributor, openExhibit } from "./open-exhibit.server.ts";
import { assertSameMembers } from "./order.ts";

export async function orderScenes(actor: Actor | null, input: z.output<typeof OrderScenes>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.order-scenes", async (c) => {
    const found = await openExhibit(c, input.exhibitId);
    const rows = await c.tx.select().from(scene).where(eq(scene.exhibitId, found.id)).orderBy(asc(scene.position));
    const before = rows.map((row) => row.id);
    assertSameMembers(before, input.order);
    if (before.every((id, at) => id === input.order[at])) return c.unchanged();
    await compareAndSet(c.tx, exhibit, found.id, input.version, {});
    for (const [at, id] of input.order.entries()) {
      await c.tx
        .update(scene)
        .set({ position: at + 1 })
        .where(eq(scene.id, id));
    }
    await noteContributor(c, found.id);
    const title = (id: string) => rows.find((row) => row.id === id)?.titleEn;
    c.audit({
      objectType: "exhibit",
      objectId: found.id,
      objectName: found.titleEn,
      before: { order: before.map(title) },
      after: { order: input.order.map(title) },
    });
    c.touch({ type: "exhibit", id: found.id });
  });
}
