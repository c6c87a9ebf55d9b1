import type { LabelData } from "./extract.ts";
import type { Fonts } from "./font.ts";
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

/** Paints a label's one or two lines into the box that starts at (left, top), px. */
export function paintLabel(
  { surface, mask }: Canvas,
  fonts: Fonts,
  { label, size, subSize }: Sized,
  left: number,
  top: number,
): void {
  coverText(mask, fonts[label.face ?? "head"], label.text, size, left, top + size * BASELINE);
  paintMask(surface, mask, label.colour, 1);
  if (!label.sub) return;
  coverText(mask, fonts.body, label.sub, subSize, left, top + size * 1.25 + subSize * BASELINE);
  paintMask(surface, mask, label.subColour ?? label.colour, 1);
}
