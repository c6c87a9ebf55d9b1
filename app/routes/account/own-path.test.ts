import { expect, test } from "vitest";
import { ownPath } from "./own-path.ts";

test("only a path of our own is followed after signing in", () => {
  expect(ownPath("/stars?q=Vega")).toBe("/stars?q=Vega");
  for (const foreign of [
    null,
    "",
    "stars",
    "//evil.example/x",
    "/\\evil.example",
    "https://evil.example",
    "/\t/evil.example",
    "/.//evil.example",
    "/stars/..//evil.example",
    "/%2e//evil.example",
  ]) {
    const path = ownPath(foreign);
    expect(new URL(path, "http://here.example").origin, String(foreign)).toBe("http://here.example");
  }
  expect(ownPath("//evil.example")).toBe("/desk");
});
