import { readFileSync } from "node:fs";
import { expect, inject, test } from "vitest";
import { expectNoSeriousAxe, newPage } from "./browser.ts";

// What the start command prints leads where it says, without signing in.

const printed = (label: string) => {
  const text = readFileSync(inject("accountsFile"), "utf8");
  const url = new RegExp(`^${label}: +(\\S+)$`, "m").exec(text)?.[1];
  if (!url) throw new Error(`The demo printed no ${label}.`);
  return url;
};

test("the demo's feed is JSON Feed 1.1 with a strong ETag, and 304 when nothing moved", async () => {
  const first = await fetch(printed("Demo feed"));
  expect(first.status).toBe(200);
  expect(first.headers.get("Content-Type")).toContain("application/feed+json");
  const feed = (await first.json()) as { version: string; items: { image: string }[] };
  expect(feed.version).toBe("https://jsonfeed.org/version/1.1");
  expect(feed.items.length).toBeGreaterThan(0);
  const tag = first.headers.get("ETag") ?? "";
  expect(tag).toMatch(/^"[^"]+"$/);
  expect((await fetch(printed("Demo feed"), { headers: { "If-None-Match": tag } })).status).toBe(304);
  for (const { image } of feed.items) {
    const still = await fetch(image);
    expect([still.status, still.headers.get("Content-Type")]).toEqual([200, "image/png"]);
  }
});

test.each([
  ["a portrait kiosk", { width: 1080, height: 1920 }],
  ["a wide kiosk", { width: 1920, height: 1080 }],
])("the demo's kiosk page is clean for axe and fits on %s, without a GPU", async (_name, viewport) => {
  const page = await newPage({ viewport, hasTouch: true });
  const answer = await page.goto(printed("Demo kiosk"));
  expect(answer?.status()).toBe(200);
  await page.getByRole("heading", { level: 1 }).first().waitFor();
  await page.waitForLoadState("networkidle");
  await expectNoSeriousAxe(page);
  expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0);
});
