import sharp from "sharp";
import type { Actor } from "#app/audit/actor.ts";
import { newId } from "#app/database/new-id.ts";
import { UploadMedia } from "#app/media/media-input.ts";
import { uploadMedia } from "#app/media/upload-media.server.ts";
import { parseInput } from "#app/parse-input.ts";

/** A plain picture that no other test has: its colour and size are the caller's, its notes are not. */
export function picturePng(width = 400, height = 300): Promise<Buffer> {
  return sharp({ create: { width, height, channels: 3, background: "#2a4a7c" } })
    .withExif({ IFD0: { ImageDescription: newId() } })
    .png()
    .toBuffer();
}

export const mediaWords = {
  creator: "M. Tern",
  creditLine: "M. Tern, Tern Point",
  licence: "own-work",
  altEn: "A blue field",
};

/** A kept picture, encoded and stored as an upload would. Its version is 1. */
export async function makeMedia(actor: Actor, overrides: Partial<typeof mediaWords & { altFr: string }> = {}) {
  const input = parseInput(UploadMedia, { ...mediaWords, ...overrides });
  const { mediaId } = await uploadMedia(actor, input, { fileName: "field.png", bytes: await picturePng() });
  return { mediaId, version: 1, ...input };
}
