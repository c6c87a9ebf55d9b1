import { and, eq, inArray, max } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { sceneCast } from "#app/database/schema/exhibits.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { AddToCast } from "./exhibit-input.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";

/** Adds records to the end of a scene's cast; those that are in it already stay where they are. */
export async function addToCast(actor: Actor | null, input: z.output<typeof AddToCast>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.add-to-cast", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const wanted = [...new Set(input.recordId)];
    const known = await c.tx
      .select({ id: record.id, name: record.name })
      .from(record)
      .where(inArray(record.id, wanted));
    if (known.length !== wanted.length) throw new Invalid({ recordId: ["One of these records does not exist."] });
    const present = await c.tx
      .select({ recordId: sceneCast.recordId })
      .from(sceneCast)
      .where(and(eq(sceneCast.sceneId, opened.scene.id), inArray(sceneCast.recordId, wanted)));
    const joining = wanted.filter((id) => !present.some((row) => row.recordId === id));
    if (joining.length === 0) return c.unchanged();
    const [last] = await c.tx
      .select({ position: max(sceneCast.position) })
      .from(sceneCast)
      .where(eq(sceneCast.sceneId, opened.scene.id));
    const from = (last?.position ?? 0) + 1;
    await c.tx
      .insert(sceneCast)
      .values(joining.map((recordId, at) => ({ sceneId: opened.scene.id, recordId, position: from + at })));
    const after = { cast: joining.map((id) => known.find((row) => row.id === id)?.name) };
    await closeScene(c, opened, input.version, {}, { before: null, after });
  });
}
