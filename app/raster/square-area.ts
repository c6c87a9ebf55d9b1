/**
 * The part of a pixel on one side of a straight edge, exactly. The pixel is the unit square around the origin; the edge
 * has the unit normal (nx, ny) and stands at `distance` along it; what is before the edge counts.
 * The corner cut off is a right triangle, so the area has a closed form; derived here, no source needed.
 */
export function areaBefore(nx: number, ny: number, distance: number): number {
  const long = Math.max(Math.abs(nx), Math.abs(ny));
  const short = Math.min(Math.abs(nx), Math.abs(ny));
  const reach = (long + short) / 2;
  const room = reach - Math.abs(distance);
  if (room <= 0) return distance < 0 ? 0 : 1;
  if (room >= short) return 0.5 + distance / long;
  const corner = (room * room) / (2 * long * short);
  return distance < 0 ? corner : 1 - corner;
}

/** A band of the plane: the points whose product with (nx, ny) lies between low and high. */
export interface Band {
  nx: number;
  ny: number;
  low: number;
  high: number;
}

type Corner = readonly [x: number, y: number];

const PIXEL: readonly Corner[] = [
  [-0.5, -0.5],
  [0.5, -0.5],
  [0.5, 0.5],
  [-0.5, 0.5],
];

/** The part of a pixel inside two bands at once: cut edge by edge (Sutherland and Hodgman), then the shoelace formula. */
export function areaInBands(first: Band, second: Band): number {
  let corners = PIXEL;
  for (const { nx, ny, low, high } of [first, second]) {
    corners = cut(cut(corners, nx, ny, high), -nx, -ny, -low);
  }
  return Math.abs(corners.reduce((sum, corner, at) => sum + cross(corner, corners[(at + 1) % corners.length]!), 0)) / 2;
}

const cross = ([x0, y0]: Corner, [x1, y1]: Corner) => x0 * y1 - x1 * y0;

/** What of a convex polygon lies before an edge. */
function cut(corners: readonly Corner[], nx: number, ny: number, limit: number): Corner[] {
  const kept: Corner[] = [];
  for (const [at, corner] of corners.entries()) {
    const next = corners[(at + 1) % corners.length]!;
    const here = limit - (corner[0] * nx + corner[1] * ny);
    const there = limit - (next[0] * nx + next[1] * ny);
    if (here >= 0) kept.push(corner);
    if (here * there >= 0) continue;
    const share = here / (here - there);
    kept.push([corner[0] + (next[0] - corner[0]) * share, corner[1] + (next[1] - corner[1]) * share]);
  }
  return kept;
}
