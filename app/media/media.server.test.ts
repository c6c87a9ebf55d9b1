import { eq } from "drizzle-orm";
import sharp from "sharp";
import { expect, test } from "vitest";
import "#app/review/register.server.ts";
import { db } from "#app/database/db.server.ts";
import { media, mediaVariant } from "#app/database/schema/media.ts";
import { Conflict, Forbidden, Invalid } from "#app/errors.ts";
import { parseInput } from "#app/parse-input.ts";
import { readUpload } from "#app/upload.server.ts";
import { makeActor } from "#tests/factories/person.ts";
import { editMedia } from "./edit-media.server.ts";
import { variantWidths } from "./encode-picture.server.ts";
import { UploadMedia } from "./media-input.ts";
import { readPictureSources, readVariant } from "./read-media.server.ts";
import { uploadMedia } from "./upload-media.server.ts";

let shade = 0;
/** A picture that no other test has. */
const picture = (width: number, height: number) => {
  shade += 1;
  return sharp({ create: { width, height, channels: 3, background: { r: shade, g: 40, b: 90 } } });
};
const words = { creator: "M. Tern", creditLine: "M. Tern, Tern Point", licence: "own-work", altEn: "A blue field" };
const input = () => parseInput(UploadMedia, words);
const keep = async (bytes: Uint8Array) => uploadMedia(await makeActor("editor"), input(), { fileName: "x.jpg", bytes });

test("a picture is kept in every format and width, under its digest, and can be read again", async () => {
  const bytes = await picture(1000, 500).jpeg().toBuffer();
  const { mediaId, alreadyKept } = await keep(bytes);
  expect(alreadyKept).toBe(false);
  const variants = await db().select().from(mediaVariant).where(eq(mediaVariant.mediaId, mediaId));
  expect(variants.map((one) => `${one.format} ${one.width}x${one.height}`).sort()).toEqual(
    ["avif", "jpeg", "webp"]
      .flatMap((format) => [`${format} 1000x500`, `${format} 480x240`, `${format} 960x480`])
      .sort(),
  );
  for (const one of variants) {
    const { bytes: read } = await readVariant(one.digest, one.format);
    const facts = await sharp(read).metadata();
    expect([facts.width, facts.height]).toEqual([one.width, one.height]);
    expect(facts.exif).toBeUndefined();
  }
});

test("the same picture twice is one picture, also when sent at once", async () => {
  const bytes = await picture(400, 300).png().toBuffer();
  const [one, two] = await Promise.all([keep(bytes), keep(bytes)]);
  expect(one.mediaId).toBe(two.mediaId);
  expect(await keep(bytes)).toEqual({ mediaId: one.mediaId, alreadyKept: true });
});

test("what a camera turned is stood upright, and its notes are left out", async () => {
  const bytes = await picture(400, 800).withMetadata({ orientation: 6 }).jpeg().toBuffer();
  const { mediaId } = await keep(bytes);
  const [row] = await db().select().from(media).where(eq(media.id, mediaId));
  expect([row?.width, row?.height]).toEqual([800, 400]);
});

test.each<[string, () => Promise<Uint8Array>, RegExp]>([
  ["text called a picture", async () => Buffer.from("not a picture at all"), /no picture/],
  ["SVG", async () => Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="900" height="900"/>'), /not taken/],
  ["a picture that is too small", async () => picture(100, 100).png().toBuffer(), /100 pixels wide/],
  [
    "too many pixels",
    async () =>
      sharp({ create: { width: 8000, height: 7000, channels: 3, background: "#123" } })
        .png()
        .toBuffer(),
    /50 million/,
  ],
  ["half a JPEG", async () => (await picture(900, 900).jpeg().toBuffer()).subarray(0, 900), /read|broken/],
])("%s is refused at the file", async (_, make, said) => {
  await expect(keep(await make())).rejects.toMatchObject({ fields: { file: [expect.stringMatching(said)] } });
});

test("creator, credit line, licence and alternative text are each asked for at their field", () => {
  const refused = (() => {
    try {
      parseInput(UploadMedia, { creator: "", creditLine: " ", licence: "", altEn: "" });
    } catch (error) {
      return Object.keys((error as Invalid).fields).sort();
    }
  })();
  expect(refused).toEqual(["altEn", "creator", "creditLine", "licence"]);
});

test("only a curator keeps pictures", async () => {
  const bytes = await picture(400, 400).png().toBuffer();
  for (const role of ["scientist", "publisher", "admin"] as const) {
    await expect(uploadMedia(await makeActor(role), input(), { fileName: "x", bytes })).rejects.toBeInstanceOf(
      Forbidden,
    );
  }
});

test("changing the credit counts versions", async () => {
  const { mediaId } = await keep(await picture(400, 401).png().toBuffer());
  const editor = await makeActor("editor");
  const edit = { mediaId, version: 1, ...input(), creditLine: "Another line" };
  await editMedia(editor, edit);
  await expect(editMedia(editor, { ...edit, creditLine: "A third" })).rejects.toBeInstanceOf(Conflict);
});

test("sources name every width, best format first", async () => {
  const { mediaId } = await keep(await picture(1000, 400).webp().toBuffer());
  const [row] = await db().select().from(media).where(eq(media.id, mediaId));
  const sources = (await readPictureSources([row?.digest ?? ""]))[row?.digest ?? ""];
  expect(sources?.map((one) => one.format)).toEqual(["avif", "webp", "jpeg"]);
  expect(sources?.[0]?.srcset.match(/\d+w/g)).toEqual(["480w", "960w", "1000w"]);
  expect(variantWidths(5000)).toEqual([480, 960, 1600, 2400]);
});

const multipart = (form: FormData) => new Request("http://127.0.0.1/x", { method: "POST", body: form });

test("a file that is too large is refused at its field, and what was typed is kept", async () => {
  const form = new FormData();
  form.set("creator", "M. Tern");
  form.set("file", new File([new Uint8Array(2_000_000)], "big.png"));
  await expect(readUpload(multipart(form), "file", 1_048_576)).rejects.toMatchObject({
    fields: { file: ["This file is too large: at most 1 MB."] },
  });
});

test("no file, an empty file and a form that is no upload are refused at the field", async () => {
  const form = new FormData();
  form.set("file", new File([], ""));
  for (const request of [multipart(form), new Request("http://127.0.0.1/x", { method: "POST", body: "a=b" })]) {
    await expect(readUpload(request, "file", 1000)).rejects.toBeInstanceOf(Invalid);
  }
});
