import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { duplicateKey } from "#app/database/database-error.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { media, mediaVariant } from "#app/database/schema/media.ts";
import { authorise } from "#app/people/authorise.ts";
import { digestOf, encodePicture, inspectPicture } from "./encode-picture.server.ts";
import type { UploadMedia } from "./media-input.ts";
import { putObject } from "./object-store.server.ts";
import { originalKey, variantKey } from "./storage-keys.ts";

export interface Uploaded {
  mediaId: string;
  /** The same picture was kept before; nothing was added. */
  alreadyKept: boolean;
}

async function findByDigest(digest: string): Promise<string | null> {
  const [found] = await db().select({ id: media.id }).from(media).where(eq(media.digest, digest));
  return found?.id ?? null;
}

/**
 * Keeps a picture: looked at by content, encoded for screens, stored under its digest, then written down. Files are stored
 * first, under names that are their content, so a failure leaves nothing half-done that anybody could see.
 * @throws Invalid at `file`, Unavailable when the store does not answer
 */
export async function uploadMedia(
  actor: Actor | null,
  input: z.output<typeof UploadMedia>,
  upload: { fileName: string; bytes: Uint8Array },
): Promise<Uploaded> {
  authorise(actor, "media.write");
  const digest = digestOf(upload.bytes);
  const kept = await findByDigest(digest);
  if (kept) return { mediaId: kept, alreadyKept: true };
  const facts = await inspectPicture(upload.bytes);
  const variants = await encodePicture(upload.bytes, facts.width);
  await putObject(originalKey(digest), upload.bytes, facts.mime);
  for (const one of variants) await putObject(variantKey(one.digest, one.format), one.bytes, `image/${one.format}`);
  const mediaId = newId();
  const row = { id: mediaId, digest, fileName: upload.fileName, bytes: upload.bytes.byteLength, ...facts, ...input };
  try {
    await change(actor, "media.upload", async (c) => {
      await c.tx.insert(media).values({ ...row, createdBy: actor.personId });
      await c.tx
        .insert(mediaVariant)
        .values(variants.map(({ bytes, ...one }) => ({ mediaId, ...one, bytes: bytes.byteLength })));
      c.audit({ objectType: "media", objectId: mediaId, objectName: upload.fileName, after: row });
    });
  } catch (error) {
    // Sent twice at once: the other one was first.
    const other = duplicateKey(error) === "media_digest" ? await findByDigest(digest) : null;
    if (!other) throw error;
    return { mediaId: other, alreadyKept: true };
  }
  return { mediaId, alreadyKept: false };
}
