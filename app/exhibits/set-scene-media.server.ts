import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { media } from "#app/database/schema/media.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { SetSceneMedia } from "./exhibit-input.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";

/** The picture that a scene shows beside its words; null takes it away. */
export async function setSceneMedia(actor: Actor | null, input: z.output<typeof SetSceneMedia>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.set-scene-media", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const { mediaId } = input;
    if (opened.scene.mediaId === mediaId) return c.unchanged();
    if (mediaId) {
      const [found] = await c.tx.select({ id: media.id }).from(media).where(eq(media.id, mediaId));
      if (!found) throw new Invalid({ mediaId: ["There is no such picture."] });
    }
    const states = { before: { mediaId: opened.scene.mediaId }, after: { mediaId } };
    await closeScene(c, opened, input.version, { mediaId }, states);
  });
}
