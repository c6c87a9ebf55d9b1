import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { media } from "#app/database/schema/media.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { EditMedia } from "./media-input.ts";

/** Credit, licence and alternative texts; seals that read them are looked at again. @throws Conflict, NotFound */
export async function editMedia(actor: Actor | null, input: z.output<typeof EditMedia>): Promise<void> {
  authorise(actor, "media.write");
  const { mediaId, version, ...after } = input;
  await change(actor, "media.edit", async (c) => {
    const [found] = await c.tx.select().from(media).where(eq(media.id, mediaId));
    if (!found) throw new NotFound("There is no such picture.");
    const { creator, creditLine, licence, altEn, altFr } = found;
    const before = { creator, creditLine, licence, altEn, altFr };
    if (JSON.stringify(before) === JSON.stringify(after)) return c.unchanged();
    await compareAndSet(c.tx, media, mediaId, version, after);
    c.audit({ objectType: "media", objectId: mediaId, objectName: found.fileName, before, after });
    c.touch({ type: "media", id: mediaId });
  });
}
