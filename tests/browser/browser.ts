import { AxeBuilder } from "@axe-core/playwright";
import { type Browser, type BrowserContext, type BrowserContextOptions, chromium, type Page } from "playwright-core";
import { afterAll, afterEach, inject } from "vitest";
import { CHROMIUM } from "#storage/test-packages.mjs";

/** Without 3d interfaces a page sees what a kiosk without a GPU sees. */
const ARGUMENTS = [
  "--no-sandbox",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
  "--disable-3d-apis",
];
const SERIOUS = new Set(["serious", "critical"]);
const STANDARD = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];

interface PageOptions extends BrowserContextOptions {
  /** Complaints that the test brings about on purpose, such as the browser's own line about a 404. */
  expected?: RegExp[];
}

let browser: Promise<Browser> | undefined;
const contexts = new Set<BrowserContext>();
const complaints: string[] = [];

function launch(): Promise<Browser> {
  browser ??= chromium.launch({ executablePath: CHROMIUM, args: ARGUMENTS });
  return browser;
}

/**
 * A page of its own browser session; paths are relative to the application. The test fails when the page says an error
 * on its console, throws, breaks the content security policy, or asks any other server for anything.
 */
export async function newPage({ expected = [], ...options }: PageOptions = {}): Promise<Page> {
  const context = await (await launch()).newContext({
    baseURL: inject("baseUrl"),
    viewport: { width: 1280, height: 800 },
    reducedMotion: "reduce",
    ...options,
  });
  contexts.add(context);
  context.setDefaultTimeout(15_000);
  const page = await context.newPage();
  watch(page, expected);
  return page;
}

function watch(page: Page, expected: RegExp[]): void {
  const complain = (text: string) => {
    if (!expected.some((pattern) => pattern.test(text))) complaints.push(text);
  };
  page.on("console", (message) => {
    if (message.type() === "error") complain(`console: ${message.text()} (${message.location().url})`);
  });
  page.on("pageerror", (error) => complain(`thrown: ${error.message}`));
  page.on("request", (request) => {
    const url = new URL(request.url());
    const own = url.origin === new URL(inject("baseUrl")).origin || ["data:", "blob:", "about:"].includes(url.protocol);
    if (!own) complain(`asked another server: ${request.url()}`);
  });
}

/** @throws when axe finds anything serious or critical against WCAG 2.2 AA on the page as it stands. */
export async function expectNoSeriousAxe(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(STANDARD).analyze();
  const found = violations
    .filter(({ impact }) => SERIOUS.has(impact ?? ""))
    .flatMap(({ id, help, nodes }) => nodes.map((node) => `${id}: ${help}: ${node.html.slice(0, 160)}`));
  if (found.length > 0) throw new Error(`axe at ${page.url()}:\n${found.join("\n")}`);
}

afterEach(async () => {
  await Promise.all([...contexts].map((context) => context.close()));
  contexts.clear();
  const heard = complaints.splice(0);
  if (heard.length > 0) throw new Error(`What pages complained about:\n${heard.join("\n")}`);
});

afterAll(async () => {
  await (await browser)?.close();
});
