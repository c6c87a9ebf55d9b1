import { cover, type Mask } from "./mask.ts";
import { type Projector, toPixels, toView } from "./project.ts";
import { areaBefore, areaInBands } from "./square-area.ts";

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

/**
 * Covers a straight line with square ends, in pixels: each pixel by exactly the share of it that lies on the line.
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
  const line: StraightLine = { startX, startY, ux, uy, length, half: widthPx / 2 };
  if (Math.abs(ux) >= Math.abs(uy)) coverColumns(mask, line);
  else coverRows(mask, line);
}

interface StraightLine {
  startX: number;
  startY: number;
  /** Direction, a unit vector. */
  ux: number;
  uy: number;
  length: number;
  half: number;
}

function coverColumns(mask: Mask, line: StraightLine): void {
  const { startX, startY, ux, uy, length, half } = line;
  const reach = (half + 0.71) / Math.abs(ux) + 1;
  const endX = startX + ux * length;
  const last = Math.min(mask.width - 1, Math.ceil(Math.max(startX, endX) + half + 1));
  for (let x = Math.max(0, Math.floor(Math.min(startX, endX) - half - 1)); x <= last; x++) {
    const centre = startY + ((x + 0.5 - startX) * uy) / ux;
    const bottom = Math.min(mask.height - 1, Math.ceil(centre + reach));
    for (let y = Math.max(0, Math.floor(centre - reach)); y <= bottom; y++) coverPixel(mask, line, x, y);
  }
}

function coverRows(mask: Mask, line: StraightLine): void {
  const { startX, startY, ux, uy, length, half } = line;
  const reach = (half + 0.71) / Math.abs(uy) + 1;
  const endY = startY + uy * length;
  const last = Math.min(mask.height - 1, Math.ceil(Math.max(startY, endY) + half + 1));
  for (let y = Math.max(0, Math.floor(Math.min(startY, endY) - half - 1)); y <= last; y++) {
    const centre = startX + ((y + 0.5 - startY) * ux) / uy;
    const right = Math.min(mask.width - 1, Math.ceil(centre + reach));
    for (let x = Math.max(0, Math.floor(centre - reach)); x <= right; x++) coverPixel(mask, line, x, y);
  }
}

/** Half a pixel's diagonal: nothing of a pixel is farther from its centre. */
const HALF_DIAGONAL = Math.SQRT1_2;

function coverPixel(mask: Mask, { startX, startY, ux, uy, length, half }: StraightLine, x: number, y: number): void {
  const dx = x + 0.5 - startX;
  const dy = y + 0.5 - startY;
  const along = dx * ux + dy * uy;
  const across = dy * ux - dx * uy;
  if (Math.abs(across) >= half + HALF_DIAGONAL) return;
  if (along <= -HALF_DIAGONAL || along >= length + HALF_DIAGONAL) return;
  const inside = along >= HALF_DIAGONAL && along <= length - HALF_DIAGONAL;
  const amount = inside
    ? areaBefore(-uy, ux, half - across) - areaBefore(-uy, ux, -half - across)
    : areaInBands(
        { nx: -uy, ny: ux, low: -half - across, high: half - across },
        { nx: ux, ny: uy, low: -along, high: length - along },
      );
  if (amount > 0) cover(mask, x, y, amount);
}
