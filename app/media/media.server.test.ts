import { S3Client } from "@aws-sdk/client-s3";
import { asc, eq } from "drizzle-orm";
import sharp from "sharp";
import { expect, test, vi } from "vitest";
import "#app/review/register.server.ts";
import { db } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { media, mediaVariant } from "#app/database/schema/media.ts";
import { seal } from "#app/database/schema/review.ts";
import { Conflict, Forbidden, Invalid, Unavailable } from "#app/errors.ts";
import { countMediaUses, readMediaUses } from "#app/exhibits/read-media-uses.server.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { setSceneMedia } from "#app/exhibits/set-scene-media.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { sealable } from "#app/review/digest.server.ts";
import { submitExhibit } from "#app/review/submit-exhibit.server.ts";
import { readUpload } from "#app/upload.server.ts";
import { makeExhibit } from "#tests/factories/exhibit.ts";
import { makeMedia } from "#tests/factories/media.ts";
import { makeActor } from "#tests/factories/person.ts";
import { editMedia } from "./edit-media.server.ts";
import { digestOf, encodePicture, inspectPicture, variantWidths } from "./encode-picture.server.ts";
import { UploadMedia } from "./media-input.ts";
import { readPictureSources, readVariant } from "./read-media.server.ts";
import { uploadMedia } from "./upload-media.server.ts";

const flat = () => sharp({ create: { width: 400, height: 300, channels: 3, background: "#2a4a7c" } });
let shade = 0;
/** A picture that no other test has. */
const picture = (width: number, height: number) => {
  shade += 1;
  return sharp({ create: { width, height, channels: 3, background: { r: shade, g: 40, b: 90 } } });
};
const moving = async () => {
  // Frames that look alike are one frame to the encoder.
  const frames = await Promise.all([picture(400, 400), picture(400, 400).negate()].map((one) => one.png().toBuffer()));
  return sharp(frames, { join: { animated: true } })
    .webp()
    .toBuffer();
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
  [
    "a PDF",
    async () => Buffer.from("%PDF-1.4\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>\n%%EOF"),
    /no picture/,
  ],
  ["a GIF", async () => picture(400, 400).gif().toBuffer(), /not taken/],
  ["a picture that moves", async () => moving(), /moves/],
  ["a picture too tall for any screen", async () => picture(320, 2000).png().toBuffer(), /6 times as tall/],
  ["half a JPEG", async () => (await picture(900, 900).jpeg().toBuffer()).subarray(0, 900), /read|broken/],
])("%s is refused at the file", async (_, make, said) => {
  await expect(keep(await make())).rejects.toMatchObject({ fields: { file: [expect.stringMatching(said)] } });
});

test("HEVC in the wrapping of AVIF is refused as a kind that is not taken", async () => {
  const avif = await picture(400, 300).avif({ effort: 0 }).toBuffer();
  const metadata = vi.spyOn(sharp.prototype, "metadata");
  const facts = await sharp(avif).metadata();
  // No encoder for HEVC is at hand, so what sharp says of such a file is written here.
  metadata.mockResolvedValueOnce({ ...facts, compression: "hevc" });
  await expect(inspectPicture(avif)).rejects.toMatchObject({ fields: { file: [expect.stringMatching(/not taken/)] } });
  metadata.mockRestore();
  await expect(inspectPicture(avif)).resolves.toMatchObject({ mime: "image/avif" });
});

test.each<[string, () => Promise<Uint8Array>, number[]]>([
  ["16 bits of grey", async () => flat().toColourspace("grey16").png().toBuffer(), [74, 74, 74]],
  ["ink colours (CMYK)", async () => flat().toColourspace("cmyk").jpeg().toBuffer(), [19, 65, 117]],
  ["a wide gamut (P3)", async () => flat().withIccProfile("p3").jpeg().toBuffer(), [42, 74, 124]],
])("%s comes out as sRGB in eight bits", async (_, make, colour) => {
  for (const one of await encodePicture(await make(), 400)) {
    const { data, info } = await sharp(one.bytes).raw().toBuffer({ resolveWithObject: true });
    expect(info.channels).toBe(3);
    for (const [at, level] of colour.entries()) expect(Math.abs((data[at] ?? -99) - level)).toBeLessThanOrEqual(3);
  }
});

test("while the store is away nothing is written down, and the same upload goes through afterwards", async () => {
  const bytes = await picture(500, 400).png().toBuffer();
  const send = S3Client.prototype.send;
  let asked = 0;
  // The store goes away in the middle: the original is kept, a variant is not.
  const away = vi.spyOn(S3Client.prototype, "send").mockImplementation(function (this: S3Client, ...args: unknown[]) {
    asked += 1;
    return asked > 2 ? Promise.reject(new Error("away")) : Reflect.apply(send, this, args);
  });
  await expect(keep(bytes)).rejects.toBeInstanceOf(Unavailable);
  away.mockRestore();
  expect(
    await db()
      .select()
      .from(media)
      .where(eq(media.digest, digestOf(bytes))),
  ).toEqual([]);
  expect(await keep(bytes)).toMatchObject({ alreadyKept: false });
});

test("every picture and every edit of its words leaves one line of history", async () => {
  const editor = await makeActor("editor");
  const { mediaId, ...words } = await makeMedia(editor);
  await editMedia(editor, { mediaId, ...words, creditLine: "Another line" });
  // A save without a change is none.
  await editMedia(editor, { mediaId, ...words, version: 2, creditLine: "Another line" });
  const lines = await db()
    .select()
    .from(auditEntry)
    .where(eq(auditEntry.objectId, mediaId))
    .orderBy(asc(auditEntry.id));
  expect(lines.map((one) => one.verb)).toEqual(["media.upload", "media.edit"]);
  expect(lines[1]?.before).toMatchObject({ creditLine: words.creditLine });
  expect(lines[1]?.after).toMatchObject({ creditLine: "Another line" });
});

test("changing the credit of a picture that a signed exhibit shows ends its seals and says what moved", async () => {
  const editor = await makeActor("editor");
  const made = await makeExhibit(editor, await makeActor("scientist"));
  const { mediaId, ...words } = await makeMedia(editor);
  await setSceneMedia(editor, { sceneId: made.sceneId, version: made.sceneVersion, mediaId });
  const [row] = await db().select().from(exhibit).where(eq(exhibit.id, made.exhibitId));
  const { digest } = sealable(await resolveExhibit(db(), made.exhibitId));
  await submitExhibit(editor, { exhibitId: made.exhibitId, version: row?.version ?? 0, digest, note: null });
  const read = () => db().select().from(seal).where(eq(seal.exhibitId, made.exhibitId));
  expect((await read())[0]?.voidedAt).toBeNull();
  await editMedia(editor, { mediaId, ...words, creditLine: "Another line" });
  const [voided] = await read();
  expect(voided?.voidedAt).not.toBeNull();
  expect(JSON.stringify(voided?.voidReason)).toContain("Another line");
  expect(await readMediaUses(editor, mediaId)).toMatchObject([{ sceneId: made.sceneId, exhibitId: made.exhibitId }]);
  expect((await countMediaUses(editor))[mediaId]).toBe(1);
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
