import type { Rgb } from "./colour.ts";

export const TILE_WIDTH = 64;
export const TILE_HEIGHT = 32;

/**
 * One frame in linear light, three floats a pixel, kept between frames. Only tiles that something is drawn into are
 * cleared and resolved; `touched` counts this frame's, `stale` those of the frame before.
 */
export interface Surface {
  width: number;
  height: number;
  light: Float32Array;
  /** sRGB bytes, opaque. */
  bytes: Uint8ClampedArray<ArrayBuffer>;
  background: Rgb;
  tilesAcross: number;
  touched: Uint8Array;
  stale: Uint8Array;
}

/** @throws RangeError when a side is not a whole number of at least 1 */
export function createSurface(width: number, height: number, background: Rgb): Surface {
  if (!Number.isInteger(width) || !Number.isInteger(height) || width < 1 || height < 1) {
    throw new RangeError("a frame is at least one whole pixel wide and high");
  }
  const tilesAcross = Math.ceil(width / TILE_WIDTH);
  const tiles = tilesAcross * Math.ceil(height / TILE_HEIGHT);
  return {
    width,
    height,
    light: new Float32Array(width * height * 3),
    bytes: new Uint8ClampedArray(width * height * 4),
    background,
    tilesAcross,
    touched: new Uint8Array(tiles),
    stale: new Uint8Array(tiles).fill(1),
  };
}

/** Begins a frame: what was drawn before is to be cleared. */
export function beginFrame(surface: Surface): void {
  for (let tile = 0; tile < surface.touched.length; tile++) {
    if (surface.touched[tile]) surface.stale[tile] = 1;
    surface.touched[tile] = 0;
  }
}

/** Makes the tiles under a rectangle (pixels, right and bottom excluded, inside the frame) ready to be drawn into. */
export function touch(surface: Surface, left: number, top: number, right: number, bottom: number): void {
  const firstColumn = Math.floor(left / TILE_WIDTH);
  const lastColumn = Math.floor((right - 1) / TILE_WIDTH);
  const lastRow = Math.floor((bottom - 1) / TILE_HEIGHT);
  for (let row = Math.floor(top / TILE_HEIGHT); row <= lastRow; row++) {
    for (let column = firstColumn; column <= lastColumn; column++) {
      const tile = row * surface.tilesAcross + column;
      if (!surface.touched[tile]) clearTile(surface, tile);
    }
  }
}

function clearTile(surface: Surface, tile: number): void {
  const { width, height, light, background } = surface;
  surface.touched[tile] = 1;
  const left = (tile % surface.tilesAcross) * TILE_WIDTH;
  const top = Math.floor(tile / surface.tilesAcross) * TILE_HEIGHT;
  const right = Math.min(left + TILE_WIDTH, width);
  const bottom = Math.min(top + TILE_HEIGHT, height);
  for (let y = top; y < bottom; y++) {
    for (let at = (y * width + left) * 3; at < (y * width + right) * 3; at += 3) {
      light[at] = background[0];
      light[at + 1] = background[1];
      light[at + 2] = background[2];
    }
  }
}
