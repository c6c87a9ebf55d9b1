import { srgbFromLinear } from "./colour.ts";
import { type Surface, TILE_HEIGHT, TILE_WIDTH } from "./surface.ts";

/** Steps of the table: fine enough that every one of the 256 sRGB values comes back from its own linear light. */
const STEPS = 16384;

const TABLE = Uint8Array.from({ length: STEPS + 1 }, (_, step) => Math.round(srgbFromLinear(step / STEPS) * 255));

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

function eachRow(surface: Surface, tile: number, row: (from: number, to: number) => void): void {
  const left = (tile % surface.tilesAcross) * TILE_WIDTH;
  const top = Math.floor(tile / surface.tilesAcross) * TILE_HEIGHT;
  const right = Math.min(left + TILE_WIDTH, surface.width);
  const bottom = Math.min(top + TILE_HEIGHT, surface.height);
  for (let y = top; y < bottom; y++) row(y * surface.width + left, y * surface.width + right);
}

function resolveTile(surface: Surface, tile: number): void {
  const { light, bytes } = surface;
  eachRow(surface, tile, (from, to) => {
    for (let pixel = from; pixel < to; pixel++) {
      const read = pixel * 3;
      const write = pixel * 4;
      bytes[write] = byteFromLinear(light[read] ?? 0);
      bytes[write + 1] = byteFromLinear(light[read + 1] ?? 0);
      bytes[write + 2] = byteFromLinear(light[read + 2] ?? 0);
      bytes[write + 3] = 255;
    }
  });
}

function fillTile(surface: Surface, tile: number): void {
  const [red, green, blue] = surface.background.map(byteFromLinear);
  eachRow(surface, tile, (from, to) => {
    for (let write = from * 4; write < to * 4; write += 4) {
      surface.bytes[write] = red ?? 0;
      surface.bytes[write + 1] = green ?? 0;
      surface.bytes[write + 2] = blue ?? 0;
      surface.bytes[write + 3] = 255;
    }
  });
}
