import { expect, test } from "vitest";
import { browserWords } from "./browser-words.ts";

test("a browser is named as its owner knows it", () => {
  const chrome =
    "Mozilla/5.0 (X11; Linux x86_64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/141.0.0.0 Safari/537.36";
  expect(browserWords(chrome)).toBe("Chrome or Chromium on Linux");
  expect(browserWords(`${chrome.replace("X11; Linux x86_64", "Windows NT 10.0; Win64; x64")} Edg/141.0`)).toBe(
    "Edge on Windows",
  );
  expect(browserWords("Mozilla/5.0 (Macintosh; Intel Mac OS X 10.15; rv:143.0) Gecko/20100101 Firefox/143.0")).toBe(
    "Firefox on macOS",
  );
  const phone = "Mozilla/5.0 (iPhone; CPU iPhone OS 18_0 like Mac OS X) AppleWebKit/605.1.15 Version/18.0 Safari/604.1";
  expect(browserWords(phone)).toBe("Safari on iOS");
});

test("what no list knows is shown as it calls itself, shortened", () => {
  expect(browserWords("curl/8.5.0")).toBe("curl/8.5.0");
  expect(browserWords("x".repeat(400))).toHaveLength(60);
  expect(browserWords("")).toBe("a program that does not say its name");
});
