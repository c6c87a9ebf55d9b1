import { cover, type Mask } from "./mask.ts";
import { type Projector, toPixels, toView } from "./project.ts";

const a = new Float64Array(3);
const b = new Float64Array(3);

/** Covers a line between two places of the world, cut where it passes the near or the far plane. */
export function coverSegment(
  mask: Mask,
  projector: Projector,
  from: ArrayLike<number>,
  to: ArrayLike<number>,
  widthPx: number,
): void {
  toView(projector, from[0]!, from[1]!, from[2]!, a);
  toView(projector, to[0]!, to[1]!, to[2]!, b);
  if (!clipDepth(a, b, projector.near, 1) || !clipDepth(a, b, projector.far, -1)) return;
  toPixels(projector, a);
  toPixels(projector, b);
  coverLine(mask, a[0]!, a[1]!, b[0]!, b[1]!, widthPx);
}

/** Moves an end on the wrong side of a plane onto it; false when both are. Side 1 keeps what is beyond, -1 what is before. */
function clipDepth(first: Float64Array, second: Float64Array, plane: number, side: 1 | -1): boolean {
  const insideFirst = (first[2]! - plane) * side;
  const insideSecond = (second[2]! - plane) * side;
  if (insideFirst < 0 && insideSecond < 0) return false;
  if (insideFirst >= 0 && insideSecond >= 0) return true;
  const share = insideFirst / (insideFirst - insideSecond);
  const moved = insideFirst < 0 ? first : second;
  const x = first[0]! + (second[0]! - first[0]!) * share;
  const y = first[1]! + (second[1]! - first[1]!) * share;
  moved[0] = x;
  moved[1] = y;
  moved[2] = plane;
  return true;
}

/** The part of a line inside a rectangle as shares of its length, or null. Liang and Barsky's method. */
function clipped(x: number, y: number, dx: number, dy: number, margin: number, width: number, height: number) {
  let enter = 0;
  let leave = 1;
  for (const [step, room] of [
    [-dx, x + margin],
    [dx, width + margin - x],
    [-dy, y + margin],
    [dy, height + margin - y],
  ] as const) {
    if (step === 0 && room < 0) return null;
    if (step < 0) enter = Math.max(enter, room / step);
    if (step > 0) leave = Math.min(leave, room / step);
  }
  return enter < leave ? { enter, leave } : null;
}

/** Overlap of the pixel-wide interval around `middle` with the interval from `low` to `high`. */
function overlap(middle: number, low: number, high: number): number {
  return Math.max(0, Math.min(middle + 0.5, high) - Math.max(middle - 0.5, low));
}

/**
 * Covers a straight line with square ends, in pixels. A pixel is covered by the product of its overlap across and along
 * the line, which is exact for upright and level lines and keeps the area of the others.
 */
export function coverLine(mask: Mask, x0: number, y0: number, x1: number, y1: number, widthPx: number): void {
  const margin = widthPx + 2;
  const part = clipped(x0, y0, x1 - x0, y1 - y0, margin, mask.width, mask.height);
  if (!part) return;
  const startX = x0 + (x1 - x0) * part.enter;
  const startY = y0 + (y1 - y0) * part.enter;
  const endX = x0 + (x1 - x0) * part.leave;
  const endY = y0 + (y1 - y0) * part.leave;
  const length = Math.hypot(endX - startX, endY - startY);
  if (!(length > 0)) return;
  const ux = (endX - startX) / length;
  const uy = (endY - startY) / length;
  const level = Math.abs(ux) >= Math.abs(uy);
  const half = widthPx / 2;
  const reach = (half + 0.71) / Math.max(Math.abs(ux), Math.abs(uy)) + 1;
  const [from, to] = level ? [startX, endX] : [startY, endY];
  const limit = level ? mask.width : mask.height;
  const acrossLimit = level ? mask.height : mask.width;
  const first = Math.max(0, Math.floor(Math.min(from, to) - half - 1));
  const last = Math.min(limit - 1, Math.ceil(Math.max(from, to) + half + 1));
  for (let along = first; along <= last; along++) {
    const slope = level ? uy / ux : ux / uy;
    const origin = level ? startY - startX * slope : startX - startY * slope;
    const centre = origin + (along + 0.5) * slope;
    const low = Math.max(0, Math.floor(centre - reach));
    const high = Math.min(acrossLimit - 1, Math.ceil(centre + reach));
    for (let across = low; across <= high; across++) {
      const px = level ? along : across;
      const py = level ? across : along;
      const dx = px + 0.5 - startX;
      const dy = py + 0.5 - startY;
      const amount = overlap(dy * ux - dx * uy, -half, half) * overlap(dx * ux + dy * uy, 0, length);
      if (amount > 0) cover(mask, px, py, amount);
    }
  }
}
