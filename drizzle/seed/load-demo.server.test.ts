import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { count, eq, isNotNull } from "drizzle-orm";
import { afterAll, beforeAll, expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { measurement, record } from "#app/database/schema/catalogue.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { person } from "#app/database/schema/people.ts";
import { seal } from "#app/database/schema/review.ts";
import { feedOf } from "#app/editions/feed.ts";
import { readNewestEdition } from "#app/editions/read-newest.server.ts";
import { checkContent } from "#app/exhibits/checks.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { passwordMatches } from "#app/people/password.server.ts";
import { cleanDatabase } from "#tests/setup/database.ts";
import { ACCOUNTS, DEMO_PASSWORD } from "./accounts.ts";
import { FAMILIAR_PATTERN, NEAREST_SUNS } from "./exhibits.ts";
import { ACCOUNTS_FILE, loadDemo } from "./load-demo.ts";
import { DEMO_KIOSK } from "./release.ts";
import { STARS } from "./stars.ts";

const folder = mkdtempSync(join(tmpdir(), "alidade-demo-"));
let said = "";

beforeAll(async () => {
  await cleanDatabase();
  said = await loadDemo(folder);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const rowsOf = async (table: typeof auditEntry | typeof edition | typeof person | typeof record) =>
  (await db().select({ n: count() }).from(table))[0]?.n;

test("the accounts open with the password that is printed, and there is one for every role", async () => {
  expect(readFileSync(join(folder, ACCOUNTS_FILE), "utf8")).toBe(said);
  for (const { email } of ACCOUNTS) {
    expect(said).toContain(email);
    const [found] = await db().select().from(person).where(eq(person.email, email));
    expect(await passwordMatches(found?.passwordHash, DEMO_PASSWORD)).toBe(true);
  }
  expect(new Set(ACCOUNTS.flatMap(({ roles }) => roles))).toEqual(
    new Set(["editor", "scientist", "publisher", "admin"]),
  );
});

test("the first edition is published, with one item a scene and a still for each", async () => {
  const live = await readNewestEdition(NEAREST_SUNS.slug);
  expect(live.number).toBe(1);
  const { items } = feedOf(NEAREST_SUNS.slug, live, "http://127.0.0.1");
  expect(items.map(({ title }) => title)).toEqual(NEAREST_SUNS.scenes.map(({ titleEn }) => titleEn));
  for (const { image, content_text } of items) {
    expect(image).toMatch(/\/stills\/[0-9a-f]{64}\.png$/);
    expect(content_text).not.toContain("{");
  }
  const [entrance] = await db().select().from(kiosk).where(eq(kiosk.slug, DEMO_KIOSK));
  expect(entrance?.exhibitId).toBe(live.exhibitId);
});

test("nobody unvetted is in the published cast, and nothing blocks or warns", async () => {
  const { content } = await readNewestEdition(NEAREST_SUNS.slug);
  expect(content.scenes.flatMap((scene) => scene.cast).filter((member) => !member.vetted)).toEqual([]);
  expect(checkContent(content)).toEqual([]);
});

test("nobody vets what they entered, and three different people carried the exhibit", async () => {
  const vetted = await db().select().from(record).where(isNotNull(record.vettedBy));
  expect(vetted.length).toBe(STARS.filter((star) => star.checked).length);
  for (const one of vetted) expect([one.createdBy, one.adoptedBy]).not.toContain(one.vettedBy);
  const hands = (await db().select().from(seal)).map((one) => one.personId);
  expect(hands.length).toBeGreaterThan(1);
  expect(new Set(hands).size).toBe(hands.length);
});

test("no vetted record has adopted a parallax from memory", async () => {
  const adopted = await db()
    .select({ fromMemory: measurement.fromMemory, state: record.state })
    .from(record)
    .innerJoin(measurement, eq(measurement.id, record.adoptedParallaxId));
  expect(adopted.length).toBe(STARS.length);
  for (const { fromMemory, state } of adopted) expect(state).toBe(fromMemory ? "draft" : "vetted");
});

test("the second exhibit waits for the two stars that nobody could compare", async () => {
  const [found] = await db().select().from(exhibit).where(eq(exhibit.slug, FAMILIAR_PATTERN.slug));
  expect(found?.state).toBe("draft");
  const checks = checkContent(await resolveExhibit(db(), found?.id ?? ""));
  expect(checks.map(({ message }) => message)).toEqual(["Mizar is not vetted.", "Megrez is not vetted."]);
});

test("a second run changes nothing", async () => {
  const tables = [auditEntry, edition, person, record] as const;
  const before = await Promise.all(tables.map(rowsOf));
  expect(await loadDemo(folder)).toContain("not loaded again");
  expect(await Promise.all(tables.map(rowsOf))).toEqual(before);
});

test("people without a whole demo are left alone, with the way out", async () => {
  const elsewhere = mkdtempSync(join(folder, "elsewhere-"));
  await expect(loadDemo(elsewhere)).rejects.toThrow("npm run db:reset");
});
