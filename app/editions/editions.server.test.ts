import { createHash } from "node:crypto";
import { eq } from "drizzle-orm";
import { parseJsonFeed } from "feedsmith";
import sharp from "sharp";
import { expect, test } from "vitest";
import type { Actor } from "#app/audit/actor.ts";
import { unvetRecord } from "#app/catalogue/vet-record.server.ts";
import { db } from "#app/database/db.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { Conflict, Forbidden, Invalid, NotFound } from "#app/errors.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { saveWords } from "#app/exhibits/save-words.server.ts";
import { assignKiosk } from "#app/kiosks/assign-kiosk.server.ts";
import { createKiosk } from "#app/kiosks/create-kiosk.server.ts";
import { readKioskPage } from "#app/kiosks/read-kiosk-page.server.ts";
import { approveExhibit } from "#app/review/approve-exhibit.server.ts";
import { sealable } from "#app/review/digest.server.ts";
import "#app/review/register.server.ts";
import { submitExhibit } from "#app/review/submit-exhibit.server.ts";
import { verifyExhibit } from "#app/review/verify-exhibit.server.ts";
import { loader as feedLoader } from "#app/routes/feed/feed.ts";
import { makeExhibit } from "#tests/factories/exhibit.ts";
import { makeActor } from "#tests/factories/person.ts";
import { publishEdition } from "./publish-edition.server.ts";
import { readNewestEdition } from "./read-newest.server.ts";
import { reissueEdition } from "./reissue-edition.server.ts";
import { readStill } from "./stills.server.ts";

const sign = async (exhibitId: string) => {
  const [row] = await db().select().from(exhibit).where(eq(exhibit.id, exhibitId));
  const { digest } = sealable(await resolveExhibit(db(), exhibitId));
  return { exhibitId, version: row?.version ?? 0, digest, note: null };
};
interface People {
  editor: Actor;
  scientist: Actor;
  publisher: Actor;
}
const review = async ({ editor, scientist, publisher }: People, exhibitId: string) => {
  await submitExhibit(editor, await sign(exhibitId));
  await verifyExhibit(scientist, await sign(exhibitId));
  await approveExhibit(publisher, await sign(exhibitId));
};
const approved = async () => {
  const people = {
    editor: await makeActor("editor"),
    scientist: await makeActor("scientist"),
    publisher: await makeActor("publisher"),
  };
  const vetter = await makeActor("scientist");
  const made = await makeExhibit(people.editor, vetter);
  await review(people, made.exhibitId);
  return { ...people, ...made, vetter };
};
const published = async () => {
  const made = await approved();
  expect(await publishEdition(made.publisher, await sign(made.exhibitId))).toBe(1);
  return made;
};
const askFeed = (slug: string, headers: Record<string, string> = {}) =>
  feedLoader({
    params: { exhibit: slug },
    request: new Request("http://127.0.0.1:4999/", { headers }),
  } as unknown as Parameters<typeof feedLoader>[0]);

test("an edition holds the approved bytes, and a still of every scene", async () => {
  const { exhibitId, slug } = await published();
  const [row] = await db().select().from(edition).where(eq(edition.exhibitId, exhibitId));
  expect(
    createHash("sha256")
      .update(row?.content ?? "")
      .digest("hex"),
  ).toBe(row?.digest);
  const live = await readNewestEdition(slug);
  expect(live.content.scenes[0]?.figures.star?.en?.text).toBe("25.04\u00a0light-years");
  for (const digest of Object.values(live.stills)) {
    const png = await readStill(digest);
    expect(createHash("sha256").update(png).digest("hex")).toBe(digest);
    expect((await sharp(png).metadata()).width).toBe(1920);
  }
});

test("the database itself refuses to change or delete an edition", async () => {
  const { exhibitId } = await published();
  const which = eq(edition.exhibitId, exhibitId);
  await expect(db().update(edition).set({ note: "x" }).where(which)).rejects.toMatchObject({
    cause: { sqlState: "45000" },
  });
  await expect(db().delete(edition).where(which)).rejects.toMatchObject({ cause: { sqlState: "45000" } });
});

test("publishing twice, also at once, makes one edition", async () => {
  const { exhibitId, publisher } = await approved();
  const input = await sign(exhibitId);
  const outcomes = await Promise.allSettled([publishEdition(publisher, input), publishEdition(publisher, input)]);
  expect(outcomes.map((one) => one.status).sort()).toEqual(["fulfilled", "rejected"]);
  await expect(publishEdition(publisher, await sign(exhibitId))).rejects.toBeInstanceOf(Conflict);
  expect(await db().select().from(edition).where(eq(edition.exhibitId, exhibitId))).toHaveLength(1);
});

test("what is not approved, and one's own work, is not published", async () => {
  const { exhibitId, editor, sceneId, sceneVersion, publisher } = await approved();
  await saveWords(editor, { sceneId, version: sceneVersion, en: "Now {star}.", fr: "" });
  await expect(publishEdition(publisher, await sign(exhibitId))).rejects.toBeInstanceOf(Conflict);
  const both = await makeActor("editor", "publisher");
  const scientist = await makeActor("scientist");
  const own = await makeExhibit(both, scientist);
  await review(
    { editor: both, scientist: await makeActor("scientist"), publisher: await makeActor("publisher") },
    own.exhibitId,
  );
  await expect(publishEdition(both, await sign(own.exhibitId))).rejects.toBeInstanceOf(Forbidden);
});

test("what is live stays as it was published, whatever happens to its records afterwards", async () => {
  const { slug, star, vetter } = await published();
  const before = await readNewestEdition(slug);
  await unvetRecord(vetter, { recordId: star.recordId, version: star.version, reason: "Again" });
  expect(await readNewestEdition(slug)).toEqual(before);
});

test("taking back is a new, higher number with the earlier bytes", async () => {
  const made = await published();
  await saveWords(made.editor, { sceneId: made.sceneId, version: made.sceneVersion, en: "Look: {star}.", fr: "" });
  await review(made, made.exhibitId);
  expect(await publishEdition(made.publisher, await sign(made.exhibitId))).toBe(2);
  const { version } = await sign(made.exhibitId);
  const back = { exhibitId: made.exhibitId, version, number: 1, note: "A misprint in the second" };
  expect(await reissueEdition(made.publisher, back)).toBe(3);
  const rows = await db().select().from(edition).where(eq(edition.exhibitId, made.exhibitId));
  const digestOf = (number: number) => rows.find((row) => row.number === number)?.digest;
  expect(digestOf(3)).toBe(digestOf(1));
  expect(digestOf(2)).not.toBe(digestOf(1));
  await expect(reissueEdition(made.publisher, { ...back, number: 9 })).rejects.toBeInstanceOf(NotFound);
  await expect(reissueEdition(made.publisher, back)).rejects.toBeInstanceOf(Conflict);
});

// JSON Feed version 1.1 (jsonfeed.org/version/1.1), read by feedsmith, a parser that is not ours.
test("the feed is JSON Feed 1.1 for an independent parser, one item a scene", async () => {
  const { slug } = await published();
  const answer = await askFeed(slug);
  expect(answer.headers.get("content-type")).toContain("application/feed+json");
  const body = await answer.text();
  const feed = parseJsonFeed(body);
  expect(feed.title).toBe("How far");
  expect(feed.feed_url).toBe(`http://127.0.0.1:4999/feed/${slug}.json`);
  expect(feed.items).toHaveLength(1);
  const [item] = feed.items ?? [];
  expect(item).toMatchObject({ title: "One star", content_text: "This star is 25.04\u00a0light-years away." });
  expect(item?.id).toContain(`/feed/${slug}/1/`);
  expect(item?.image).toMatch(/\/stills\/[0-9a-f]{64}\.png$/);
  const raw = JSON.parse(body);
  expect(raw.version).toBe("https://jsonfeed.org/version/1.1");
  expect(raw.items[0]._alidade).toMatchObject({
    edition: 1,
    digest: expect.stringMatching(/^[0-9a-f]{64}$/),
    figures: [
      {
        key: "star",
        value: "25.04",
        range: { low: "24.98", high: "25.11", meaning: "68 %" },
        source: { citation: expect.any(String), doi: expect.any(String), locator: "row 1" },
      },
    ],
  });
});

test("the feed has a strong ETag, and answers 304 to whoever has it", async () => {
  const { slug } = await published();
  const first = await askFeed(slug);
  const tag = first.headers.get("etag") ?? "";
  expect(tag).toMatch(/^"[0-9a-f]{64}"$/);
  const again = await askFeed(slug, { "If-None-Match": `"other", ${tag}` });
  expect([again.status, await again.text(), again.headers.get("etag")]).toEqual([304, "", tag]);
  expect((await askFeed(slug, { "If-None-Match": '"other"' })).status).toBe(200);
  expect((await askFeed("nothing-here")).status).toBe(404);
});

test("a kiosk shows the newest edition of what it is assigned to, and only what is published", async () => {
  const admin = await makeActor("admin");
  const { exhibitId, slug, publisher } = await approved();
  const kioskId = await createKiosk(admin, {
    slug: `k-${slug.slice(-20)}`,
    name: "K",
    station: "S",
    language: "en",
    idleSeconds: 60,
  });
  const assign = { kioskId, version: 1, exhibitId };
  await expect(assignKiosk(publisher, assign)).rejects.toBeInstanceOf(Invalid);
  const page = () => readKioskPage(`k-${slug.slice(-20)}`);
  expect((await page()).edition).toBeNull();
  await publishEdition(publisher, await sign(exhibitId));
  await assignKiosk(publisher, assign);
  expect((await page()).edition?.number).toBe(1);
  await expect(assignKiosk(publisher, { ...assign, exhibitId: null })).rejects.toBeInstanceOf(Conflict);
  await expect(assignKiosk(admin, assign)).rejects.toBeInstanceOf(Forbidden);
  await expect(readKioskPage("nowhere")).rejects.toBeInstanceOf(NotFound);
});
