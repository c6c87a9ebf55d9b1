import { asc, desc, eq, inArray } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { VARIANT_FORMATS, type VariantFormat } from "#app/database/enums.ts";
import { media, mediaVariant } from "#app/database/schema/media.ts";
import { person } from "#app/database/schema/people.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { getObject } from "./object-store.server.ts";
import { variantKey } from "./storage-keys.ts";

/** One `<source>` of a picture. */
export interface PictureSource {
  format: VariantFormat;
  /** "/pictures/… 480w, …" */
  srcset: string;
}

const address = (one: { digest: string; format: VariantFormat }) => `/pictures/${one.digest}.${one.format}`;

/** The sources of pictures by the digest of their originals; public, since kiosks show them. */
export async function readPictureSources(digests: string[]): Promise<Record<string, PictureSource[]>> {
  if (digests.length === 0) return {};
  const rows = await db()
    .select({
      original: media.digest,
      digest: mediaVariant.digest,
      format: mediaVariant.format,
      width: mediaVariant.width,
    })
    .from(mediaVariant)
    .innerJoin(media, eq(media.id, mediaVariant.mediaId))
    .where(inArray(media.digest, digests))
    .orderBy(asc(mediaVariant.width));
  return Object.fromEntries(
    digests.map((original) => [
      original,
      VARIANT_FORMATS.map((format) => ({
        format,
        srcset: rows
          .filter((row) => row.original === original && row.format === format)
          .map((row) => `${address(row)} ${row.width}w`)
          .join(", "),
      })),
    ]),
  );
}

/** Every picture, newest first. */
export async function readMediaList(actor: Actor | null) {
  authorise(actor, "media.read");
  const rows = await db().select().from(media).orderBy(desc(media.id));
  const sources = await readPictureSources(rows.map((row) => row.digest));
  return rows.map((row) => ({ ...row, createdAt: row.createdAt.toISOString(), sources: sources[row.digest] ?? [] }));
}

/** @throws NotFound */
export async function readMedia(actor: Actor | null, mediaId: string) {
  authorise(actor, "media.read");
  const [found] = await db()
    .select({ row: media, keptBy: person.name })
    .from(media)
    .innerJoin(person, eq(person.id, media.createdBy))
    .where(eq(media.id, mediaId));
  if (!found) throw new NotFound("There is no such picture.");
  const { row, keptBy } = found;
  const sources = await readPictureSources([row.digest]);
  return { ...row, keptBy, createdAt: row.createdAt.toISOString(), sources: sources[row.digest] ?? [] };
}

/** The bytes of a variant. @throws NotFound */
export async function readVariant(
  digest: string,
  format: string,
): Promise<{ bytes: Uint8Array; format: VariantFormat }> {
  const known = VARIANT_FORMATS.find((one) => one === format);
  if (!known || !/^[0-9a-f]{64}$/.test(digest)) throw new NotFound("There is no such picture.");
  return { bytes: await getObject(variantKey(digest, known)), format: known };
}
