import { readFileSync } from "node:fs";
import { expect, test } from "vitest";

// WCAG 2.2: relative luminance and contrast ratio by their definitions in its glossary; 1.4.3 asks 4.5:1 for text,
// 1.4.11 asks 3:1 for the outlines of controls. The pairs are read from the style sheet itself.
const css = readFileSync(new URL("../app.css", import.meta.url), "utf8");

type Palette = Record<string, string>;

function paletteOf(block: string): Palette {
  const found = block.matchAll(/--color-([a-z-]+):\s*(#[0-9a-f]{6});/g);
  return Object.fromEntries([...found].map(([, name, value]) => [name!, value!]));
}

function between(start: string, end: string): string {
  const from = css.indexOf(start);
  expect(from, start).toBeGreaterThan(-1);
  return css.slice(from, css.indexOf(end, from));
}

const light = paletteOf(between("@theme {", "\n}"));
const grounds: [string, Palette][] = [
  ["light", light],
  ["dark", { ...light, ...paletteOf(between("@variant dark {", "\n    }")) }],
  ["night", { ...light, ...paletteOf(between(".night {", "\n    }")) }],
];

function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
}

function contrast(a: string, b: string): number {
  const [high, low] = [luminance(a), luminance(b)].toSorted((x, y) => y - x);
  return (high! + 0.05) / (low! + 0.05);
}

const GROUNDS = ["paper", "paper-shade", "sheet", "vermilion-wash", "brass-wash", "verdigris-wash"];
const TEXTS = ["ink", "ink-soft", "vermilion", "brass", "verdigris"];

test("the formula gives the ratios that follow from its definition", () => {
  expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 10);
  expect(contrast("#777777", "#777777")).toBe(1);
});

test("each scheme sets all its colours", () => {
  for (const [name, palette] of grounds) {
    for (const token of [...GROUNDS, ...TEXTS, "edge", "rule"])
      expect(palette[token], `${name} ${token}`).toBeDefined();
  }
  expect(new Set(grounds.map(([, palette]) => palette.paper)).size).toBe(3);
});

test("every text colour is readable on every ground, in light, dark and night", () => {
  for (const [name, palette] of grounds) {
    for (const ground of GROUNDS) {
      for (const text of TEXTS) {
        expect(contrast(palette[text]!, palette[ground]!), `${name}: ${text} on ${ground}`).toBeGreaterThanOrEqual(4.5);
      }
    }
  }
});

test("outlines of controls stand out from every ground", () => {
  for (const [name, palette] of grounds) {
    for (const ground of GROUNDS) {
      expect(contrast(palette.edge!, palette[ground]!), `${name}: edge on ${ground}`).toBeGreaterThanOrEqual(3);
    }
  }
});

test("starlight is readable on the night ground that the office uses beside its paper", () => {
  for (const text of ["starlight", "starlight-soft"]) {
    for (const ground of ["night", "night-shade"]) {
      expect(contrast(light[text]!, light[ground]!), `${text} on ${ground}`).toBeGreaterThanOrEqual(4.5);
    }
  }
});
