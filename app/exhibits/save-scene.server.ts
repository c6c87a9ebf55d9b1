import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { SceneDocument } from "#app/scene/document.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";
import type { SaveScene } from "./save-scene-input.ts";

/** Titles and the scene document (scale, rings, view). */
export async function saveScene(actor: Actor | null, input: z.output<typeof SaveScene>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.save-scene", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const { titleEn, titleFr } = opened.scene;
    const before = { titleEn, titleFr, document: SceneDocument.parse(opened.scene.document) };
    const after = { titleEn: input.titleEn, titleFr: input.titleFr, document: input.document };
    if (JSON.stringify(before) === JSON.stringify(after)) return c.unchanged();
    await closeScene(c, opened, input.version, after, { before, after });
  });
}
