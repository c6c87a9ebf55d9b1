import { parseJsonFeed } from "feedsmith";
import type { Page } from "playwright-core";
import { expect, inject, test } from "vitest";
import { newPage } from "./browser.ts";
import { signInAs } from "./sign-in-as.ts";

// From a published table to a visitor's touch: three people, an administrator and a visitor, each in a browser of their own.

const button = (page: Page, name: string | RegExp) =>
  page.getByRole("button", { name, exact: typeof name === "string" });
const said = (page: Page, text: string | RegExp) => page.getByRole("status").filter({ hasText: text }).waitFor();
const openFold = (page: Page, name: string) => page.locator("summary").filter({ hasText: name }).click();

async function follow(page: Page, from: string, name: string): Promise<void> {
  await page.goto(from);
  await page.getByRole("main").getByRole("link", { name, exact: true }).first().click();
  await page.getByRole("heading", { level: 1, name }).waitFor();
}

async function takeTableIn(page: Page): Promise<void> {
  await page.goto("/sources/new");
  await page.getByLabel("Title").fill("A table for the whole chain");
  await page.getByLabel("Authors").fill("Tern, A.; Point, B.");
  await page.getByLabel("Year").fill("2024");
  await page.getByLabel("DOI").fill("10.9999/chain-of-custody");
  await button(page, "Keep the source").click();
  await page.getByRole("heading", { level: 1, name: "Tern et al. 2024" }).waitFor();
  await page.goto("/intake");
  await page.getByLabel("A table to bring in").setInputFiles("tests/fixtures/four-stars.csv");
  await button(page, "Read this table").click();
  await page.getByRole("heading", { level: 1, name: "four-stars.csv" }).waitFor();
  await page.getByLabel("Source of this table").selectOption({ label: "Tern et al. 2024" });
  await page.getByLabel("Where in the source").fill("table 1");
  await page.getByLabel(/^Epoch/).fill("1991.25");
  await page.getByLabel("Adopt the parallax of each new record").check();
  await page.getByLabel("Why these parallaxes count").fill("The only measurement of these stars");
  await button(page, "See what would happen").click();
  await page.getByRole("heading", { name: "What would happen" }).waitFor();
  expect(await page.locator("#dry-run dl").textContent()).toMatch(/New records\s*4Records/);
  await button(page, "Take it into the catalogue").click();
  await said(page, "The table is in the catalogue");
}

async function vet(page: Page, name: string): Promise<void> {
  await follow(page, `/stars?q=${encodeURIComponent(name)}`, name);
  await button(page, "Vet this record").click();
  await said(page, "The record is vetted");
}

/** An exhibit of one scene with two of the stars and one bound figure. @returns its address */
async function buildExhibit(page: Page): Promise<string> {
  await page.goto("/exhibits/new");
  await page.getByLabel(/^Title(?! in)/).fill("The chain");
  await page.getByLabel("Address").fill("the-chain");
  await button(page, "Create the exhibit").click();
  await page.getByRole("heading", { level: 1, name: "The chain" }).waitFor();
  const address = new URL(page.url()).pathname;
  await page.getByLabel("A new scene").fill("Two suns");
  await button(page, "Add the scene").click();
  await page.getByRole("heading", { level: 1, name: "Two suns" }).waitFor();
  for (const [count, star] of ["Chain star one", "Chain star two"].entries()) {
    await page.getByLabel("Add a record").selectOption({ label: star });
    await button(page, "Add to the cast").click();
    await page.getByRole("list", { name: "Cast" }).getByRole("listitem").nth(count).waitFor();
  }
  await page.getByRole("link", { name: "Words" }).click();
  await openFold(page, "Bind a figure");
  await page.getByLabel("Key").fill("one");
  await page.getByLabel("Whose number").selectOption({ label: "Chain star one" });
  await button(page, "Bind it").click();
  await page.getByText("{one}", { exact: true }).waitFor();
  await page.getByLabel("Words in English").fill("The first star is {one} away.");
  await button(page, "Keep the words").click();
  await page.getByRole("paragraph").filter({ hasText: "The first star is 25.04\u00a0light-years away." }).waitFor();
  return address;
}

async function submit(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await button(page, "Submit for verification").click();
  await said(page, "Submitted");
}

/** How many mails of a subject the catcher holds; the worker sends them a moment after the change. */
async function caught(admin: Page, subject: string): Promise<number> {
  await admin.goto("/mail");
  return admin.getByRole("link", { name: subject }).count();
}

const keptEdition = (page: Page) => page.getByText(/^Edition \d+ ·/).textContent();

test("a table becomes records, an exhibit, two sign-offs, an edition and what a visitor touches", {
  timeout: 180_000,
}, async () => {
  const [curator, scientist, publisher, admin] = await Promise.all([newPage(), newPage(), newPage(), newPage()]);
  await signInAs(curator, "editor");
  await signInAs(scientist, "scientist");
  await signInAs(publisher, "publisher");
  await signInAs(admin, "admin");

  await takeTableIn(curator);
  await vet(scientist, "Chain star one");
  await vet(scientist, "Chain star two");
  const address = await buildExhibit(curator);
  const exhibitId = address.split("/").at(-1) ?? "";
  await submit(curator, address);

  // Nobody signs their own work: the curator is told that it is not their turn.
  await curator.goto(`/reviews/${exhibitId}`);
  await curator.getByRole("heading", { name: "It is not your turn" }).waitFor();
  await scientist.goto(`/reviews/${exhibitId}`);
  await button(scientist, "Verify and seal").click();
  await said(scientist, "Verified and sealed");
  await publisher.goto(`/reviews/${exhibitId}`);
  await button(publisher, "Approve and seal").click();
  await said(publisher, "Approved");
  await publisher.goto(`/editions/${exhibitId}`);
  await button(publisher, "Publish edition 1").click();
  await said(publisher, "Edition 1 is published");

  await admin.goto("/kiosks/new");
  await admin.getByLabel("Address").fill("chain-kiosk");
  await admin.getByLabel(/^Name/).fill("Chain kiosk");
  await admin.getByLabel("Station").fill("Workshop");
  await button(admin, "Set it up").click();
  await admin.getByRole("heading", { level: 1, name: "Chain kiosk" }).waitFor();
  const kiosk = new URL(admin.url()).pathname;
  await publisher.goto(kiosk);
  await publisher.getByLabel("Exhibit").selectOption({ label: "The chain, edition 1" });
  await button(publisher, "Show this").click();
  await said(publisher, "Kept");

  const visitor = await newPage({ viewport: { width: 1080, height: 1920 } });
  await visitor.goto("/k/chain-kiosk");
  await visitor.getByRole("heading", { level: 1, name: "Two suns" }).waitFor();
  expect(await visitor.evaluate(() => document.createElement("canvas").getContext("webgl"))).toBeNull();
  expect(await visitor.getByRole("main").textContent()).toContain("The first star is 25.04\u00a0light-years away.");
  await visitor.locator("canvas").waitFor();
  const stage = visitor.getByRole("application");
  await stage.focus();
  await stage.press("n");
  await visitor.getByRole("heading", { level: 2, name: /Chain star/ }).waitFor();
  await button(visitor, "How do we know?").click();
  const why = visitor.getByRole("dialog");
  expect(await why.textContent()).toMatch(/Tern et al\. 2024/);
  await button(visitor, "Close").click();

  // The feed, for a parser that is not ours; and nothing is sent twice to whoever has it.
  const feed = `${inject("baseUrl")}/feed/the-chain.json`;
  const answer = await fetch(feed);
  const parsed = parseJsonFeed(await answer.text());
  expect(parsed.items?.map((item) => item.title)).toEqual(["Two suns"]);
  const again = await fetch(feed, { headers: { "If-None-Match": answer.headers.get("etag") ?? "" } });
  expect(again.status).toBe(304);

  // Another value is adopted: the seals end, and it is told which figure moved. What is published stays.
  await follow(curator, "/stars?q=Chain+star+one", "Chain star one");
  await openFold(curator, "Add a measurement");
  await curator.getByLabel("As printed").fill("128.93 ± 0.55");
  await curator.locator("#measure-sourceId").selectOption({ label: "Tern et al. 2024" });
  await curator.getByText("25.30\u00a0light-years").first().waitFor();
  await button(curator, "Propose this measurement").click();
  await said(curator, /is proposed|is kept/);
  await openFold(curator, "Adopt another value");
  const choice = curator.getByLabel("The parallax that counts");
  await choice.selectOption({ index: 1 });
  await curator.getByLabel("Why this one").fill("To see what follows");
  await button(curator, "Adopt it").click();
  await said(curator, "The parallax is adopted");
  await curator.goto(address);
  const moved = await curator.getByRole("main").textContent();
  expect(moved).toMatch(/figure \{one\} in the words/);
  expect(moved).toMatch(/25\.04.light-years[\s\S]*25\.30.light-years/);
  expect(moved).toContain("reads differently");
  await visitor.reload();
  expect(await keptEdition(visitor)).toContain("Edition 1");
  expect(await visitor.getByRole("main").textContent()).toContain("25.04\u00a0light-years");

  // Whoever's turn it was had mail.
  for (const subject of [
    "To verify: The chain",
    "To approve: The chain",
    "Approved: The chain",
    "Edition 1: The chain",
    "Moved: The chain",
  ]) {
    await expect.poll(() => caught(admin, subject), { timeout: 15_000, interval: 500 }).toBeGreaterThan(0);
  }
  await admin.goto(`/audit?type=exhibit&object=${exhibitId}`);
  expect(await admin.getByRole("main").textContent()).toMatch(/review\.verify[\s\S]*review\.submit/);
});
