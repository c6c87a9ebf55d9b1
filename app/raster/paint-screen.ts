import type { Object3D } from "three";
import { isLine, type LabelData, type LineObject, segmentsOf } from "./extract.ts";
import type { Fonts } from "./font.ts";
import { measureLabel } from "./label-requests.ts";
import { coverLine } from "./lines.ts";
import { paintMask } from "./mask.ts";
import { paintLabel } from "./paint-label.ts";
import { type Canvas, lineWidth } from "./paint-objects.ts";
import type { Rectangle } from "./place-labels.ts";

/**
 * Paints a group that is laid out on the screen: userData.screen is "top-left" or "bottom-right", and x and y of what is
 * in it are px from that corner (before the pixel ratio), y down. Lines and labels; labels stand where they are put,
 * their top at y. Returns the rectangles that the labels take.
 */
export function paintScreen(canvas: Canvas, group: Object3D, fonts: Fonts): Rectangle[] {
  const { surface, mask, pixelRatio } = canvas;
  const far = group.userData.screen === "bottom-right";
  const toX = (x: number) => (far ? surface.width : 0) + x * pixelRatio;
  const toY = (y: number) => (far ? surface.height : 0) + y * pixelRatio;
  const taken: Rectangle[] = [];
  group.traverseVisible((object) => {
    if (isLine(object)) paintScreenLine(object);
    const label = object.userData.label as LabelData | undefined;
    if (!label) return;
    const measured = measureLabel(label, fonts, pixelRatio);
    const left = toX(object.position.x) - (label.align === "right" ? measured.width : 0);
    const top = toY(object.position.y);
    paintLabel(canvas, fonts, { label, ...measured }, left, top);
    taken.push({ left, top, right: left + measured.width, bottom: top + measured.height });
  });
  return taken;

  function paintScreenLine(line: LineObject): void {
    const at = line.geometry.getAttribute("position");
    const { color, opacity = 1 } = line.material;
    for (const [from, to] of segmentsOf(line)) {
      const width = lineWidth(line) * pixelRatio;
      coverLine(mask, toX(at.getX(from)), toY(at.getY(from)), toX(at.getX(to)), toY(at.getY(to)), width);
    }
    paintMask(surface, mask, color ? [color.r, color.g, color.b] : [1, 1, 1], opacity);
  }
}
