import { expect, test } from "vitest";
import { figureKeys, parseWords, plainWords } from "./words.ts";

test("a key in braces is a figure, a blank line parts paragraphs", () => {
  expect(parseWords("Vega is {vega} away.\n\nSo is {x-2}")).toEqual([
    [{ text: "Vega is " }, { figure: "vega" }, { text: " away." }],
    [{ text: "So is " }, { figure: "x-2" }],
  ]);
});

test("braces that hold no key, clock times and ratios stay text", () => {
  const body = "At 20:30 the 3:1 {Not a key} {} { vega } {9} stays.";
  expect(parseWords(body)).toEqual([[{ text: body }]]);
});

test("line ends of every system part paragraphs alike", () => {
  expect(parseWords("a\r\n\r\nb")).toEqual(parseWords("a\n \nb"));
});

test("a figure that is not bound stays visible", () => {
  expect(plainWords(parseWords("{a} and {b}"), (key) => (key === "a" ? "25 light-years" : null))).toEqual([
    "25 light-years and {b}",
  ]);
});

test("keys are told once, in order of first use", () => {
  expect(figureKeys("{b} {a} {b}")).toEqual(["b", "a"]);
});
