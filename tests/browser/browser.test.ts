import { expect, test } from "vitest";
import { expectNoSeriousAxe, newPage } from "./browser.ts";

test("axe refuses pale text and a picture without words, and accepts the same page mended", async () => {
  const page = await newPage();
  const show = (alt: string, colour: string) =>
    page.setContent(
      `<html lang="en"><title>t</title><main><h1>h</h1><img ${alt} src="data:,"><p style="color:${colour}">words</p></main>`,
    );
  await show("", "#eee");
  await expect(expectNoSeriousAxe(page)).rejects.toThrow(/color-contrast[\s\S]*image-alt/);
  await show('alt="a star"', "#111");
  await expectNoSeriousAxe(page);
});

test("a page of the tests sees no GPU, as a kiosk does not", async () => {
  const page = await newPage();
  expect(await page.evaluate(() => document.createElement("canvas").getContext("webgl2"))).toBeNull();
});
