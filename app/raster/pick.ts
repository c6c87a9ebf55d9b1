import type { Camera, Scene } from "three";
import { extract, isPoints } from "./extract.ts";
import { projectPoints } from "./paint-objects.ts";
import { projectorOf } from "./project.ts";

export interface Picked {
  /** userData of the Points that hold the star. */
  userData: Record<string, unknown>;
  name: string;
  /** The star's number in them. */
  index: number;
}

/**
 * The star nearest to (x, y) on the screen, or null when none is within the radius; of two at the same place the nearer
 * to the eye. Only Points with userData.pick take part. All in pixels of one size of picture.
 */
export function pickStar(
  scene: Scene,
  camera: Camera,
  { width, height }: { width: number; height: number },
  x: number,
  y: number,
  radiusPx: number,
): Picked | null {
  scene.updateMatrixWorld();
  camera.updateMatrixWorld();
  const projector = projectorOf(camera, width, height);
  let best: Picked | null = null;
  let bestSquare = radiusPx * radiusPx;
  let bestDepth = Number.POSITIVE_INFINITY;
  for (const points of extract(scene).drawn.filter(isPoints)) {
    if (!points.userData.pick) continue;
    const places = projectPoints(projector, points);
    for (let at = 0; at < places.length; at += 3) {
      const [dx, dy, depth] = [places[at]! - x, places[at + 1]! - y, places[at + 2]!];
      const square = dx * dx + dy * dy;
      if (Number.isNaN(depth) || square > bestSquare || (square === bestSquare && depth >= bestDepth)) continue;
      bestSquare = square;
      bestDepth = depth;
      best = { userData: points.userData, name: points.name, index: at / 3 };
    }
  }
  return best;
}
