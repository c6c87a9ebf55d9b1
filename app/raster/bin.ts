import { type Surface, TILE_HEIGHT, TILE_WIDTH } from "./surface.ts";

/** Light reaches this far beyond its star at most; stars farther outside the frame are left out. */
const MARGIN = 256;

/**
 * The numbers of the stars that may be seen, those of one tile together: light is then added to memory that is at hand.
 * A counting sort; within a tile the given order is kept.
 * @param places x, y, depth a star, depth NaN where it is not in view
 */
export function binByTile(
  places: Float64Array,
  surface: Pick<Surface, "width" | "height" | "tilesAcross">,
): Uint32Array {
  const { width, height, tilesAcross } = surface;
  const tilesDown = Math.ceil(height / TILE_HEIGHT);
  const starts = new Uint32Array(tilesAcross * tilesDown + 1);
  const stars = places.length / 3;
  const tiles = new Int32Array(stars).fill(-1);
  for (let star = 0; star < stars; star++) {
    const x = places[star * 3]!;
    const y = places[star * 3 + 1]!;
    const seen = x > -MARGIN && y > -MARGIN && x < width + MARGIN && y < height + MARGIN;
    if (!seen || Number.isNaN(places[star * 3 + 2])) continue;
    const column = Math.min(Math.max(Math.floor(x / TILE_WIDTH), 0), tilesAcross - 1);
    const row = Math.min(Math.max(Math.floor(y / TILE_HEIGHT), 0), tilesDown - 1);
    const tile = row * tilesAcross + column;
    tiles[star] = tile;
    starts[tile + 1] = starts[tile + 1]! + 1;
  }
  for (let tile = 1; tile < starts.length; tile++) starts[tile] = starts[tile]! + starts[tile - 1]!;
  const sorted = new Uint32Array(starts.at(-1) ?? 0);
  for (let star = 0; star < stars; star++) {
    const tile = tiles[star]!;
    if (tile < 0) continue;
    sorted[starts[tile]!] = star;
    starts[tile] = starts[tile]! + 1;
  }
  return sorted;
}
