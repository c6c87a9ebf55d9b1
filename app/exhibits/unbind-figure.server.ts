import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { sceneFigure, sceneWords } from "#app/database/schema/exhibits.ts";
import { Locked } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";
import type { UnbindFigure } from "./save-words-input.ts";
import { figureKeys } from "./words.ts";

/** @throws Locked while the words still name the figure. */
export async function unbindFigure(actor: Actor | null, input: z.output<typeof UnbindFigure>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.unbind-figure", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const rows = await c.tx.select().from(sceneWords).where(eq(sceneWords.sceneId, opened.scene.id));
    if (rows.some((row) => figureKeys(row.body).includes(input.key))) {
      throw new Locked(`The words still name {${input.key}}. Take it out of the words first.`);
    }
    const which = and(eq(sceneFigure.sceneId, opened.scene.id), eq(sceneFigure.key, input.key));
    const [was] = await c.tx.select().from(sceneFigure).where(which);
    if (!was) return c.unchanged();
    await c.tx.delete(sceneFigure).where(which);
    await closeScene(c, opened, input.version, {}, { before: was, after: null });
  });
}
