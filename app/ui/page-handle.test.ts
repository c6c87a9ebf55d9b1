import { expect, test } from "vitest";
import { pageFacts } from "./page-handle.ts";

test("a page that says nothing is English on paper with margins", () => {
  expect(pageFacts([{}, { handle: undefined, loaderData: null }])).toEqual({
    ground: "paper",
    bleed: false,
    language: "en",
  });
});

test("the innermost route decides", () => {
  const facts = pageFacts([
    { handle: { ground: "paper", bleed: true } },
    { handle: { ground: "night" }, loaderData: { language: "fr" } },
  ]);
  expect(facts).toEqual({ ground: "night", bleed: true, language: "fr" });
});

test("what is not a two-letter language never reaches the page", () => {
  expect(pageFacts([{ loaderData: { language: '"><script>' } }]).language).toBe("en");
});
