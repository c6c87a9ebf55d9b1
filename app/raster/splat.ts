import { PHASES, stampOf } from "./stamps.ts";
import { type Surface, touch } from "./surface.ts";

/** Adds a star's light at (x, y) in pixels, wherever it reaches into the frame. Linear light, additive. */
export function splat(
  surface: Surface,
  x: number,
  y: number,
  sizePx: number,
  red: number,
  green: number,
  blue: number,
): void {
  const pixelX = Math.floor(x);
  const pixelY = Math.floor(y);
  const { side, middle, values } = stampOf(
    sizePx,
    Math.floor((x - pixelX) * PHASES),
    Math.floor((y - pixelY) * PHASES),
  );
  const left = pixelX - middle;
  const top = pixelY - middle;
  const fromX = Math.max(left, 0);
  const fromY = Math.max(top, 0);
  const toX = Math.min(left + side, surface.width);
  const toY = Math.min(top + side, surface.height);
  if (fromX >= toX || fromY >= toY) return;
  touch(surface, fromX, fromY, toX, toY);
  const { light, width } = surface;
  for (let row = fromY; row < toY; row++) {
    let read = (row - top) * side + fromX - left;
    let write = (row * width + fromX) * 3;
    for (let column = fromX; column < toX; column++, read++, write += 3) {
      const value = values[read]!;
      light[write] = light[write]! + value * red;
      light[write + 1] = light[write + 1]! + value * green;
      light[write + 2] = light[write + 2]! + value * blue;
    }
  }
}
