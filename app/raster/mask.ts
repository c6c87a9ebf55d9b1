import type { Rgb } from "./colour.ts";
import { type Surface, touch } from "./surface.ts";

/**
 * How much of each pixel one object covers. An object is gathered first and painted once, so that where its own pieces
 * meet nothing is painted twice.
 */
export interface Mask {
  width: number;
  height: number;
  coverage: Float32Array;
  /** The pixels with any coverage, in the order they were met. */
  pixels: Uint32Array;
  count: number;
}

export function createMask(width: number, height: number): Mask {
  return { width, height, coverage: new Float32Array(width * height), pixels: new Uint32Array(1024), count: 0 };
}

/** Adds coverage to a pixel inside the frame. */
export function cover(mask: Mask, x: number, y: number, amount: number): void {
  const at = y * mask.width + x;
  if (mask.coverage[at] === 0) {
    if (mask.count === mask.pixels.length) {
      const grown = new Uint32Array(mask.count * 2);
      grown.set(mask.pixels);
      mask.pixels = grown;
    }
    mask.pixels[mask.count++] = at;
  }
  mask.coverage[at] = mask.coverage[at]! + amount;
}

/** Paints a colour over what the mask covers and empties the mask. */
export function paintMask(surface: Surface, mask: Mask, colour: Rgb, opacity: number): void {
  const { light, width } = surface;
  for (let at = 0; at < mask.count; at++) {
    const pixel = mask.pixels[at]!;
    const alpha = Math.min(mask.coverage[pixel]!, 1) * opacity;
    mask.coverage[pixel] = 0;
    const y = Math.floor(pixel / width);
    const x = pixel - y * width;
    touch(surface, x, y, x + 1, y + 1);
    const write = pixel * 3;
    light[write] = light[write]! + (colour[0] - light[write]!) * alpha;
    light[write + 1] = light[write + 1]! + (colour[1] - light[write + 1]!) * alpha;
    light[write + 2] = light[write + 2]! + (colour[2] - light[write + 2]!) * alpha;
  }
  mask.count = 0;
}
