import { expect, test } from "vitest";
import { pathHere, themeCookie, themeFromCookie } from "./theme-choice.ts";

test("a stored choice comes back from among other cookies", () => {
  const pair = themeCookie("dark", false).split(";")[0]!;
  expect(themeFromCookie(`session=abc; ${pair}; x=y`)).toBe("dark");
});

test("no cookie, or one that says something else, follows the system", () => {
  expect(themeFromCookie(null)).toBe("system");
  expect(themeFromCookie("theme=<script>")).toBe("system");
  expect(themeFromCookie("mytheme=dark")).toBe("system");
});

test("the cookie is marked secure only where the site is", () => {
  expect(themeCookie("light", true)).toContain("; Secure");
  expect(themeCookie("light", false)).not.toContain("Secure");
});

test("the way back never leaves this site", () => {
  expect(pathHere("/stars/1?tab=words")).toBe("/stars/1?tab=words");
  expect(pathHere("//elsewhere.example/x")).toBe("/");
  expect(pathHere("/\\elsewhere.example")).toBe("/");
  expect(pathHere("https://elsewhere.example")).toBe("/");
  expect(pathHere("javascript:alert(1)")).toBe("/");
  expect(pathHere(null)).toBe("/");
});
