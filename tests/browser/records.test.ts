import type { Page } from "playwright-core";
import { expect, test } from "vitest";
import { newPage } from "./browser.ts";
import { signInAs } from "./sign-in-as.ts";

// Records in the browser, with JavaScript: what the server tests cannot see.

const REFUSED = { expected: [/status of 4\d\d/] };

async function editor(nth: number): Promise<Page> {
  const page = await newPage(REFUSED);
  await signInAs(page, "editor", nth);
  return page;
}

const keep = (page: Page) => page.getByRole("button", { name: "Keep the record" }).click();

async function newRecord(page: Page, name: string): Promise<string> {
  await page.goto("/stars/new");
  await page.getByLabel("Name", { exact: false }).first().fill(name);
  await keep(page);
  await page.getByRole("heading", { level: 1, name }).waitFor();
  return new URL(page.url()).pathname;
}

test("the second of two who save one record sees both values, keeps what they typed, and can save", async () => {
  const [first, second] = [await editor(0), await editor(1)];
  const path = await newRecord(first, "Saved by two");
  await first.goto(`${path}/edit`);
  await second.goto(`${path}/edit`);
  await first.locator("[name=name]").fill("Of the first");
  await keep(first);
  await first.getByRole("heading", { level: 1, name: "Of the first" }).waitFor();
  await second.locator("[name=name]").fill("Of the second");
  await keep(second);
  await second.getByText("Somebody else saved this while you were typing").waitFor();
  const row = second.getByRole("row", { name: /^Name/ });
  expect(await row.getByRole("cell").allInnerTexts()).toEqual([
    expect.stringContaining("Of the first"),
    expect.stringContaining("Of the second"),
  ]);
  expect(await second.locator("[name=name]").inputValue()).toBe("Of the second");
  await keep(second);
  await second.getByRole("heading", { level: 1, name: "Of the second" }).waitFor();
});

test("an identifier that another record has leads to that record", async () => {
  const page = await editor(0);
  await page.goto("/stars/new");
  await page.locator("[name=name]").fill("A second Vega");
  await page.locator("[name=identifiers]").fill("HIP 91262");
  await keep(page);
  await page.getByRole("link", { name: "Open Vega" }).click();
  await page.getByRole("heading", { level: 1, name: "Vega" }).waitFor();
});

test("the distance follows while a parallax is typed: its regime, its range, and two peaks where there are two", async () => {
  const page = await editor(0);
  await newRecord(page, "Typed live");
  const live = page.getByText("The distance that follows appears here").locator("..");
  await live.waitFor();
  const answer = page.locator("[aria-live=polite]", { hasText: /parallax/ }).first();
  await page.getByLabel("As printed").fill("130.23 ± 0.36");
  await answer.getByText("25.04 light-years", { exact: false }).waitFor();
  await page.getByLabel("As printed").fill("5.95 ± 0.85");
  await answer.getByText("between 480 and 640 light-years").waitFor();
  await page.getByLabel("As printed").fill("1 ± 0.3");
  await answer.getByText("choose a named prior", { exact: false }).waitFor();
  await page.getByRole("button", { name: "Propose this measurement" }).click();
  await page.getByRole("status").filter({ hasText: "prior-led" }).waitFor();
  await page.getByLabel("Prior", { exact: true }).selectOption("edsd");
  await page.getByLabel("Its length").fill("20000");
  await page.getByText("The posterior has two peaks", { exact: false }).waitFor();
});
