import type { Page } from "playwright-core";
import { expect, test } from "vitest";
import { expectNoSeriousAxe, newPage } from "./browser.ts";
import { signInAs } from "./sign-in-as.ts";

const PORTRAIT = { width: 1080, height: 1920 };
const shownEdition = (page: Page) => page.getByText(/^(Edition|Édition) \d+/).textContent();

test.each([
  ["in portrait", PORTRAIT],
  ["on a wide screen", { width: 1920, height: 1080 }],
])(
  "every scene of the demo's kiosk is clean for axe %s, and nothing lies beside the screen",
  async (_name, viewport) => {
    const page = await newPage({ viewport });
    await page.goto("/k/entrance");
    const scenes = await page.getByRole("navigation").getByRole("link").count();
    for (let scene = 1; scene < scenes; scene += 1) {
      await page.goto(`/k/entrance?scene=${scene}`);
      await page.locator("canvas").waitFor();
      await page.getByRole("application").press("n");
      await page.getByRole("button", { name: "How do we know?" }).waitFor();
      await expectNoSeriousAxe(page);
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(
        0,
      );
    }
    await page.getByRole("button", { name: "How do we know?" }).click();
    await expectNoSeriousAxe(page);
  },
);

test("French is a touch away, in words, numbers and the page's own language", async () => {
  const page = await newPage({ viewport: PORTRAIT });
  await page.goto("/k/entrance");
  await page.getByRole("link", { name: "Français" }).click();
  await page.getByRole("heading", { level: 1, name: "Au coin de la rue" }).waitFor();
  expect(await page.evaluate(() => document.documentElement.lang)).toBe("fr");
  expect(await page.getByRole("main").textContent()).toContain("8,60\u00a0années-lumière");
});

test("without JavaScript the kiosk shows its still, its words and the way to the other scenes", async () => {
  const page = await newPage({ viewport: PORTRAIT, javaScriptEnabled: false });
  await page.goto("/k/entrance");
  expect(await page.getByRole("main").textContent()).toContain("8.60\u00a0light-years");
  const still = page.getByRole("main").locator("img").first();
  expect(await still.getAttribute("src")).toMatch(/^\/stills\/[0-9a-f]{64}\.png$/);
  await page.getByRole("link", { name: /How far is that bright star/ }).click();
  await page.getByRole("heading", { level: 1, name: /How far is that bright star/ }).waitFor();
});

async function makePatient(admin: Page, seconds: string): Promise<void> {
  await admin.goto("/kiosks");
  await admin.getByRole("main").getByRole("link", { name: "Entrance hall" }).click();
  await admin.getByLabel(/^Starts again after/).fill(seconds);
  await admin.getByRole("button", { name: "Keep it" }).click();
  await admin.getByRole("status").filter({ hasText: "Kept" }).waitFor();
}

async function reissue(publisher: Page): Promise<void> {
  await publisher.goto("/editions");
  await publisher.getByRole("main").getByRole("link", { name: "The nearest suns" }).first().click();
  await publisher.locator("summary").filter({ hasText: "Issue it again" }).first().click();
  await publisher.getByLabel("Why it comes back").first().fill("To see the kiosk take it");
  await publisher
    .getByRole("button", { name: /^Issue edition \d+ again$/ })
    .first()
    .click();
  await publisher.getByRole("status").filter({ hasText: "is published" }).waitFor();
}

/** A second edition with other words, by the demo's own people: taking back needs something to take back. */
async function publishAnother(): Promise<Page> {
  const [curator, scientist, publisher] = await Promise.all([newPage(), newPage(), newPage()]);
  await signInAs(curator, "editor");
  await signInAs(scientist, "scientist");
  await signInAs(publisher, "publisher");
  await curator.goto("/exhibits");
  await curator.getByRole("main").getByRole("link", { name: "The nearest suns" }).click();
  await curator.getByRole("heading", { level: 1, name: "The nearest suns" }).waitFor();
  const exhibit = curator.url().split("/").at(-1)?.split("?")[0] ?? "";
  await curator.locator("summary").filter({ hasText: "Titles" }).click();
  await curator.getByLabel(/^Title(?! in)/).fill("The nearest suns of all");
  await curator.getByRole("button", { name: "Keep the titles" }).click();
  await curator.getByRole("button", { name: "Submit for verification" }).click();
  await curator.getByRole("status").filter({ hasText: "Submitted" }).waitFor();
  await scientist.goto(`/reviews/${exhibit}`);
  await scientist.getByRole("button", { name: "Verify and seal" }).click();
  await scientist.getByRole("status").filter({ hasText: "Verified" }).waitFor();
  await publisher.goto(`/reviews/${exhibit}`);
  await publisher.getByRole("button", { name: "Approve and seal" }).click();
  await publisher.getByRole("status").filter({ hasText: "Approved" }).waitFor();
  await publisher.goto(`/editions/${exhibit}`);
  await publisher.getByRole("button", { name: /^Publish edition/ }).click();
  await publisher.getByRole("status").filter({ hasText: "is published" }).waitFor();
  return publisher;
}

test("a kiosk asks before it begins again, and takes a new edition only while nobody is there", {
  timeout: 170_000,
}, async () => {
  const admin = await newPage();
  await signInAs(admin, "admin");
  await makePatient(admin, "20");
  const visitor = await newPage({ viewport: PORTRAIT });
  await visitor.goto("/k/entrance?scene=2");
  expect(await shownEdition(visitor)).toContain("Edition 1");
  const publisher = await publishAnother();
  // Somebody is touching: minutes may pass, the edition under the hand stays.
  for (let touch = 0; touch < 6; touch += 1) {
    await visitor.getByRole("application").press("ArrowLeft");
    await visitor.waitForTimeout(2500);
  }
  expect(await shownEdition(visitor)).toContain("Edition 1");
  const question = visitor.getByRole("dialog", { name: "Are you still there?" });
  await question.waitFor({ timeout: 30_000 });
  await visitor.getByRole("button", { name: "Yes, go on" }).click();
  await question.waitFor({ state: "detached" });
  expect(new URL(visitor.url()).searchParams.get("scene")).toBe("2");
  // Left alone it asks again, begins again, and then takes what is new.
  await visitor.waitForURL((url) => url.search === "", { timeout: 60_000 });
  await visitor.getByText("Edition 2").waitFor({ timeout: 30_000 });
  await visitor.getByText("The nearest suns of all").first().waitFor();
  await reissue(publisher);
  await visitor.getByText("Edition 3").waitFor({ timeout: 60_000 });
});

test("a cast is put in order by the keyboard and by the pointer, and stays so", async () => {
  const curator = await newPage();
  await signInAs(curator, "editor");
  await curator.goto("/exhibits");
  await curator.getByRole("main").getByRole("link", { name: "A familiar pattern, from the side" }).click();
  await curator.getByRole("link", { name: "Seven stars, one picture" }).click();
  const cast = curator.getByRole("list", { name: "Cast" });
  const names = async () =>
    (await cast.getByRole("button", { name: /^Move / }).all()).reduce<Promise<string[]>>(
      async (all, one) => [...(await all), (await one.getAttribute("aria-label")) ?? ""],
      Promise.resolve([]),
    );
  await cast.waitFor();
  const before = await names();
  const first = cast.getByRole("button", { name: before[0] ?? "", exact: true });
  await first.focus();
  await curator.keyboard.press("Space");
  await curator.getByText(/(^Lifted|is over place 1)/).waitFor({ state: "attached" });
  await curator.keyboard.press("ArrowDown");
  await curator.getByText(/is over place 2/).waitFor({ state: "attached" });
  const kept = () => curator.waitForResponse((answer) => answer.request().method() === "POST");
  await Promise.all([kept(), curator.keyboard.press("Space")]);
  await curator.reload();
  const after = await names();
  expect(after.slice(0, 2)).toEqual([before[1], before[0]]);
  const handle = await cast.getByRole("button", { name: after[0] ?? "", exact: true }).boundingBox();
  const target = await cast.getByRole("button", { name: after[1] ?? "", exact: true }).boundingBox();
  if (!handle || !target) throw new Error("the handles are not on the page");
  await curator.mouse.move(handle.x + handle.width / 2, handle.y + handle.height / 2);
  await curator.mouse.down();
  await curator.mouse.move(handle.x + 10, handle.y + 40, { steps: 4 });
  await curator.mouse.move(target.x + target.width / 2, target.y + target.height - 4, { steps: 8 });
  await Promise.all([kept(), curator.mouse.up()]);
  await curator.reload();
  expect((await names()).slice(0, 2)).toEqual(before.slice(0, 2));
});
