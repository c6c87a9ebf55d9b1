import { eq } from "drizzle-orm";
import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { mediaVariant } from "#app/database/schema/media.ts";
import { digestOf } from "#app/media/encode-picture.server.ts";
import { makeMedia } from "#tests/factories/media.ts";
import { makeActor } from "#tests/factories/person.ts";
import { loader } from "./picture.ts";

const ask = (file: string, headers: Record<string, string> = {}) =>
  loader({
    params: { file },
    request: new Request(`http://127.0.0.1:4999/pictures/${file}`, { headers }),
  } as unknown as Parameters<typeof loader>[0]);

test("anybody is given every variant under the digest of its bytes, to keep for good", async () => {
  const { mediaId } = await makeMedia(await makeActor("editor"));
  const variants = await db().select().from(mediaVariant).where(eq(mediaVariant.mediaId, mediaId));
  expect(variants.map((one) => one.format).sort()).toEqual(["avif", "jpeg", "webp"]);
  for (const { digest, format, bytes } of variants) {
    const answer = await ask(`${digest}.${format}`);
    expect(answer.headers.get("Content-Type")).toBe(`image/${format}`);
    expect(answer.headers.get("Cache-Control")).toBe("public, max-age=31536000, immutable");
    const body = new Uint8Array(await answer.arrayBuffer());
    expect([body.byteLength, digestOf(body)]).toEqual([bytes, digest]);
    const again = await ask(`${digest}.${format}`, { "If-None-Match": `"${digest}"` });
    expect([again.status, await again.text()]).toEqual([304, ""]);
  }
});

test("what is no variant is not found: another format, another digest, an original, a path", async () => {
  const { mediaId } = await makeMedia(await makeActor("editor"));
  const [row] = await db().select().from(mediaVariant).where(eq(mediaVariant.mediaId, mediaId));
  const other = row?.format === "avif" ? "jpeg" : "avif";
  const files = [
    `${row?.digest}.${other}`,
    `${row?.digest}.${row?.format}.${row?.format}`,
    `${row?.digest}.exe`,
    `${row?.digest}`,
    `${"0".repeat(64)}.avif`,
    "../originals/x.avif",
  ];
  for (const file of files) expect((await ask(file)).status).toBe(404);
});
