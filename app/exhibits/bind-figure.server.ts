import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { sceneFigure } from "#app/database/schema/exhibits.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";
import type { BindFigure } from "./save-words-input.ts";

/** Binds a key to a record's number, or changes what a key is bound to. */
export async function bindFigure(actor: Actor | null, input: z.output<typeof BindFigure>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.bind-figure", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const [whose] = await c.tx.select({ name: record.name }).from(record).where(eq(record.id, input.recordId));
    if (!whose) throw new Invalid({ recordId: ["There is no such record."] });
    const { key, recordId, quantity, unit, form } = input;
    const [was] = await c.tx
      .select()
      .from(sceneFigure)
      .where(and(eq(sceneFigure.sceneId, opened.scene.id), eq(sceneFigure.key, key)));
    const bound = { recordId, quantity, unit, form };
    if (was && (Object.keys(bound) as (keyof typeof bound)[]).every((name) => was[name] === bound[name])) {
      return c.unchanged();
    }
    if (was) await c.tx.update(sceneFigure).set(bound).where(eq(sceneFigure.id, was.id));
    else await c.tx.insert(sceneFigure).values({ sceneId: opened.scene.id, key, ...bound });
    const after = { key, of: whose.name, quantity, unit, form };
    await closeScene(c, opened, input.version, {}, { before: was ?? null, after });
  });
}
