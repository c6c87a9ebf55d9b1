import type { Page } from "playwright-core";
import { expect, test } from "vitest";
import { expectNoSeriousAxe, newPage } from "./browser.ts";
import { signInAs } from "./sign-in-as.ts";

// Every kind of page that each role can reach by following links, with the demo in it.

const ROLES = ["editor", "scientist", "publisher", "admin"];
/** The words of addresses; every other part names one thing of many. */
const WORDS = new Set(
  "desk stars sources intake exhibits media reviews editions kiosks people audit mail account pattern-book new edit scenes".split(
    " ",
  ),
);
const VIEWS = [
  { width: 1280, height: 800, colorScheme: "light" },
  { width: 390, height: 844, colorScheme: "dark" },
] as const;
const NOT_A_PAGE = /^\/(stills|feed|pictures|api|theme|sign-out|k)\b|\.(png|json|webp|avif|jpg)$/;

/** "/stars/01J.../edit" is a page of the kind "/stars/:one/edit". */
const kindOf = (path: string) => path.replace(/(?<=\/)[^/]+/g, (part) => (WORDS.has(part) ? part : ":one"));

/** A kind of page is measured once, with the first role that reaches it. */
const measured = new Set<string>();

async function linksOf(page: Page): Promise<string[]> {
  const paths = await page.$$eval("a[href^='/']", (links) =>
    links.map((link) => new URL((link as HTMLAnchorElement).href).pathname),
  );
  return paths.filter((path) => !NOT_A_PAGE.test(path));
}

async function expectFits(page: Page): Promise<void> {
  const wider = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(wider, `pixels too wide: ${page.url()}`).toBeLessThanOrEqual(0);
}

async function lookAt(page: Page, path: string): Promise<string[]> {
  const answer = await page.goto(path);
  expect(answer?.status(), path).toBe(200);
  await page.getByRole("heading", { level: 1 }).first().waitFor();
  const links = await linksOf(page);
  if (measured.has(kindOf(path))) return links;
  measured.add(kindOf(path));
  for (const { width, height, colorScheme } of VIEWS) {
    await page.setViewportSize({ width, height });
    await page.emulateMedia({ colorScheme });
    await expectFits(page);
    await expectNoSeriousAxe(page);
  }
  return links;
}

test.each(ROLES)(
  "what the role %s can reach answers, is clean for axe and fits, on a desk and on a phone at night",
  async (role) => {
    const page = await newPage();
    await signInAs(page, role);
    const waiting = [new URL(page.url()).pathname];
    const seen = new Set<string>();
    const wrong: string[] = [];
    for (let path = waiting.shift(); path; path = waiting.shift()) {
      if (seen.has(kindOf(path))) continue;
      seen.add(kindOf(path));
      try {
        waiting.push(...(await lookAt(page, path)));
      } catch (error) {
        wrong.push(`${path}: ${error instanceof Error ? error.message : error}`);
      }
    }
    expect(wrong.join("\n\n")).toBe("");
    // The walk itself works: a wall of refusals or a page without links would end it early.
    expect([...seen]).toEqual(expect.arrayContaining(["/desk", "/account"]));
  },
);
