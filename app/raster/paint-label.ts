import type { Rgb } from "./colour.ts";
import type { LabelData } from "./extract.ts";
import type { FontStack, Fonts } from "./font.ts";
import { LINE } from "./label-requests.ts";
import { paintMask } from "./mask.ts";
import type { Canvas } from "./paint-objects.ts";
import { coverText } from "./text.ts";

/** Share of a line's height at which its baseline stands. */
const BASELINE = 0.98;

interface Sized {
  label: LabelData;
  size: number;
  subSize: number;
}

/** How far around its letters a label keeps lines away, px before the pixel ratio, and how much of them it takes away. */
const CLEARING_PX = 2;
const CLEARED = 0.85;

/** Paints a label's one or two lines into the box that starts at (left, top), px. */
export function paintLabel(canvas: Canvas, fonts: Fonts, sized: Sized, left: number, top: number): void {
  const { label, size, subSize } = sized;
  const face = fonts[label.face ?? "head"];
  paintText(canvas, face, label.text, size, left, top + size * BASELINE, label.colour);
  if (!label.sub) return;
  const baseline = top + size * LINE + subSize * BASELINE;
  paintText(canvas, fonts.body, label.sub, subSize, left, baseline, label.subColour ?? label.colour);
}

function paintText(canvas: Canvas, face: FontStack, text: string, size: number, x: number, y: number, colour: Rgb) {
  const { surface, mask, pixelRatio } = canvas;
  const around = CLEARING_PX * pixelRatio;
  for (const dx of [-around, 0, around]) {
    for (const dy of [-around, 0, around]) coverText(mask, face, text, size, x + dx, y + dy);
  }
  paintMask(surface, mask, surface.background, CLEARED);
  coverText(mask, face, text, size, x, y);
  paintMask(surface, mask, colour, 1);
}
