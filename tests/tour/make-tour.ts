import { chromium, type Page } from "playwright-core";
import sharp from "sharp";
import { CHROMIUM } from "#storage/test-packages.mjs";

// The pictures of README.md, from the demo as `npm start` serves it: npx tsx tests/tour/make-tour.ts [address]
const base = process.argv[2] ?? "http://127.0.0.1:4310";
const PASSWORD = "tern-point-demo";

const browser = await chromium.launch({ executablePath: CHROMIUM, args: ["--no-sandbox", "--disable-3d-apis"] });

async function open(width: number, height: number): Promise<Page> {
  const context = await browser.newContext({ baseURL: base, viewport: { width, height }, reducedMotion: "reduce" });
  return context.newPage();
}

async function signIn(email: string): Promise<Page> {
  const page = await open(1280, 860);
  await page.goto("/sign-in");
  await page.getByLabel("Mail address").fill(email);
  await page.getByLabel("Password").fill(PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL(/\/desk/);
  return page;
}

async function take(page: Page, name: string): Promise<void> {
  await page.waitForLoadState("networkidle");
  await page.waitForTimeout(800);
  const picture = sharp(await page.screenshot()).webp({ quality: 78 });
  await picture.toFile(`tests/tour/${name}.webp`);
  console.log(name);
}

async function follow(page: Page, from: string, name: string): Promise<void> {
  await page.goto(from);
  await page.getByRole("main").getByRole("link", { name, exact: true }).first().click();
  await page.getByRole("heading", { level: 1, name }).waitFor();
}

const curator = await signIn("ines@tern-point.example");
await curator.goto("/stars");
await take(curator, "1-stars");
await follow(curator, "/stars?q=Vega", "Vega");
await take(curator, "2-record");
await curator.goto("/intake");
await take(curator, "3-intake");
await follow(curator, "/exhibits", "The nearest suns");
await curator.getByRole("link", { name: "Around the corner" }).click();
await curator.getByRole("link", { name: "Words" }).click();
await curator.locator("canvas").waitFor();
await take(curator, "4-scene");

const publisher = await signIn("maud@tern-point.example");
await follow(publisher, "/reviews", "The nearest suns");
await take(publisher, "5-review");
await follow(publisher, "/editions", "The nearest suns");
await take(publisher, "6-edition");

const visitor = await open(1080, 1920);
await visitor.goto("/k/entrance");
await visitor.locator("canvas").waitFor();
const stage = visitor.getByRole("application");
await stage.focus();
await stage.press("n");
await stage.press("n");
await take(visitor, "7-kiosk");
await browser.close();
