import type { Font, Glyph } from "opentype.js";
import * as opentype from "opentype.js";

// Node reads the package as CommonJS, where everything hangs under "default"; bundlers read its module.
const { parse } = (Reflect.get(opentype, "default") ?? opentype) as typeof opentype;

/** Faces of one style, first choice first: a letter comes from the first face that has it. */
export type FontStack = readonly Font[];

/** What labels are set in: names, and the smaller lines under them. */
export interface Fonts {
  head: FontStack;
  body: FontStack;
}

/** Reads a face from the bytes of a .woff, .ttf or .otf file. @throws Error when it is none of them */
export function parseFont(bytes: ArrayBuffer): Font {
  return parse(bytes);
}

export interface SetGlyph {
  font: Font;
  glyph: Glyph;
  /** Where the glyph's origin stands from the start of the line, px. */
  x: number;
}

/** A line of text set at a size: glyphs with kerning inside each face, and the line's width in px. */
export function setLine(fonts: FontStack, text: string, sizePx: number): { glyphs: SetGlyph[]; width: number } {
  const glyphs: SetGlyph[] = [];
  let x = 0;
  for (const letter of text) {
    const font = fonts.find((face) => face.hasChar(letter)) ?? fonts[0];
    if (!font) break;
    const glyph = font.charToGlyph(letter);
    const scale = sizePx / font.unitsPerEm;
    const before = glyphs.at(-1);
    if (before?.font === font) x += font.getKerningValue(before.glyph, glyph) * scale;
    glyphs.push({ font, glyph, x });
    x += (glyph.advanceWidth ?? 0) * scale;
  }
  return { glyphs, width: x };
}
