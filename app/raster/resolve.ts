import { srgbFromLinear } from "./colour.ts";
import { type Surface, TILE_HEIGHT, TILE_WIDTH } from "./surface.ts";

/** Steps of the table: fine enough that every one of the 256 sRGB values comes back from its own linear light. */
const STEPS = 16384;

const TABLE = Uint8Array.from({ length: STEPS + 1 }, (_, step) => Math.round(srgbFromLinear(step / STEPS) * 255));

/** Alpha in a pixel read as one little-endian number: every machine that runs Node or Chromium is little-endian. */
const OPAQUE = 0xff000000;

/** One channel, linear light to an sRGB byte; held at 0 and 1. */
export function byteFromLinear(value: number): number {
  return TABLE[value <= 0 ? 0 : value >= 1 ? STEPS : (value * STEPS + 0.5) | 0] ?? 0;
}

/** Linear light to bytes: the tiles drawn into, and the background where the frame before had something. */
export function resolveFrame(surface: Surface): void {
  for (let tile = 0; tile < surface.touched.length; tile++) {
    if (surface.touched[tile]) resolveTile(surface, tile);
    else if (surface.stale[tile]) fillTile(surface, tile);
    surface.stale[tile] = 0;
  }
}

interface Span {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

function spanOf(surface: Surface, tile: number): Span {
  const left = (tile % surface.tilesAcross) * TILE_WIDTH;
  const top = Math.floor(tile / surface.tilesAcross) * TILE_HEIGHT;
  const right = Math.min(left + TILE_WIDTH, surface.width);
  return { left, right, top, bottom: Math.min(top + TILE_HEIGHT, surface.height) };
}

// The lookup is written out three times: this loop runs over every pixel that anything is drawn near.
function resolveTile(surface: Surface, tile: number): void {
  const { light, width } = surface;
  const pixels = new Uint32Array(surface.bytes.buffer);
  const { left, right, top, bottom } = spanOf(surface, tile);
  for (let y = top; y < bottom; y++) {
    let read = (y * width + left) * 3;
    for (let pixel = y * width + left; pixel < y * width + right; pixel++, read += 3) {
      const red = light[read]!;
      const green = light[read + 1]!;
      const blue = light[read + 2]!;
      pixels[pixel] =
        TABLE[red >= 1 ? STEPS : (red * STEPS + 0.5) | 0]! |
        (TABLE[green >= 1 ? STEPS : (green * STEPS + 0.5) | 0]! << 8) |
        (TABLE[blue >= 1 ? STEPS : (blue * STEPS + 0.5) | 0]! << 16) |
        OPAQUE;
    }
  }
}

function fillTile(surface: Surface, tile: number): void {
  const [red = 0, green = 0, blue = 0] = surface.background.map(byteFromLinear);
  const pixels = new Uint32Array(surface.bytes.buffer);
  const { left, right, top, bottom } = spanOf(surface, tile);
  for (let y = top; y < bottom; y++) {
    pixels.fill(red | (green << 8) | (blue << 16) | OPAQUE, y * surface.width + left, y * surface.width + right);
  }
}
