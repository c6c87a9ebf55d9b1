import type { Font, Glyph } from "opentype.js";
import { addEdge, coverageOf, createArea } from "./area.ts";
import { type FontStack, setLine } from "./font.ts";
import { cover, type Mask } from "./mask.ts";
import { walkOutline } from "./outline.ts";

/** A glyph's coverage; left and top are counted from the pixel that its origin stands in. */
interface Drawn {
  left: number;
  top: number;
  width: number;
  height: number;
  coverage: Float32Array;
}

const QUARTERS = 4;
/** A kiosk shows few sizes; a page that zooms through many starts over instead of growing without end. */
const MOST_KEPT = 4096;

const kept = new WeakMap<Font, Map<string, Drawn>>();

/** Covers a line of text whose baseline starts at (x, y), pixels; places are kept to a quarter of a pixel. */
export function coverText(mask: Mask, fonts: FontStack, text: string, sizePx: number, x: number, y: number): void {
  for (const set of setLine(fonts, text, sizePx).glyphs) {
    const quarterX = Math.round((x + set.x) * QUARTERS);
    const quarterY = Math.round(y * QUARTERS);
    const drawn = drawnGlyph(set.font, set.glyph, sizePx, mod(quarterX), mod(quarterY));
    stampGlyph(mask, drawn, Math.floor(quarterX / QUARTERS), Math.floor(quarterY / QUARTERS));
  }
}

const mod = (quarter: number) => ((quarter % QUARTERS) + QUARTERS) % QUARTERS;

function drawnGlyph(font: Font, glyph: Glyph, sizePx: number, phaseX: number, phaseY: number): Drawn {
  const glyphs = kept.get(font) ?? new Map<string, Drawn>();
  kept.set(font, glyphs);
  const key = `${glyph.index} ${sizePx} ${phaseX} ${phaseY}`;
  let drawn = glyphs.get(key);
  if (!drawn) {
    drawn = drawGlyph(font, glyph, sizePx, phaseX / QUARTERS, phaseY / QUARTERS);
    if (glyphs.size >= MOST_KEPT) glyphs.clear();
    glyphs.set(key, drawn);
  }
  return drawn;
}

function drawGlyph(font: Font, glyph: Glyph, sizePx: number, x: number, y: number): Drawn {
  const path = glyph.getPath(x, y, sizePx, {}, font);
  const box = { left: Number.POSITIVE_INFINITY, top: Number.POSITIVE_INFINITY, right: -1e9, bottom: -1e9 };
  walkOutline(path, (x0, y0, x1, y1) => {
    if (x0 === x1 && y0 === y1) return;
    box.left = Math.min(box.left, x0, x1);
    box.right = Math.max(box.right, x0, x1);
    box.top = Math.min(box.top, y0, y1);
    box.bottom = Math.max(box.bottom, y0, y1);
  });
  if (!(box.right > box.left)) return { left: 0, top: 0, width: 0, height: 0, coverage: new Float32Array(0) };
  const left = Math.floor(box.left);
  const top = Math.floor(box.top);
  const width = Math.ceil(box.right) - left + 1;
  const height = Math.ceil(box.bottom) - top + 1;
  const area = createArea(width, height);
  walkOutline(path, (x0, y0, x1, y1) => addEdge(area, x0 - left, y0 - top, x1 - left, y1 - top));
  return { left, top, width, height, coverage: coverageOf(area) };
}

function stampGlyph(mask: Mask, drawn: Drawn, originX: number, originY: number): void {
  for (let row = 0; row < drawn.height; row++) {
    const y = originY + drawn.top + row;
    if (y < 0 || y >= mask.height) continue;
    for (let column = 0; column < drawn.width; column++) {
      const x = originX + drawn.left + column;
      const amount = drawn.coverage[row * drawn.width + column]!;
      if (amount > 0 && x >= 0 && x < mask.width) cover(mask, x, y, amount);
    }
  }
}
