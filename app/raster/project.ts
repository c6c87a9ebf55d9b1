import type { Camera, Matrix4 } from "three";

/**
 * A camera as numbers. Everything is in doubles, and the camera's place is subtracted before anything is multiplied:
 * what is near the camera stays exact however far both are from the origin.
 */
export interface Projector {
  width: number;
  height: number;
  perspective: boolean;
  /** Distances along the view, scene units. */
  near: number;
  far: number;
  /** The camera's place. */
  x: number;
  y: number;
  z: number;
  /** Rows of the rotation from the world to the view. */
  rotation: Float64Array;
  /** Scale and shift from the view's plane to clip space, x then y. */
  scaleX: number;
  shiftX: number;
  scaleY: number;
  shiftY: number;
}

type Clipped = Camera & { near?: number; far?: number; isPerspectiveCamera?: boolean };

/** The camera's matrices must be up to date. Its world matrix may turn and move, not scale. Size in pixels. */
export function projectorOf(camera: Camera, width: number, height: number): Projector {
  const world = camera.matrixWorld.elements;
  const lens = camera.projectionMatrix.elements;
  const { near = 0, far = Number.POSITIVE_INFINITY, isPerspectiveCamera } = camera as Clipped;
  const perspective = isPerspectiveCamera === true;
  return {
    width,
    height,
    perspective,
    near,
    far,
    x: world[12],
    y: world[13],
    z: world[14],
    rotation: Float64Array.of(...[0, 1, 2, 4, 5, 6, 8, 9, 10].map((at) => world[at] ?? 0)),
    scaleX: lens[0],
    shiftX: perspective ? -lens[8] : lens[12],
    scaleY: lens[5],
    shiftY: perspective ? -lens[9] : lens[13],
  };
}

/** World to view: out = [right, up, depth], depth growing away from the camera. Never fails. */
export function toView(projector: Projector, x: number, y: number, z: number, out: Float64Array): void {
  const r = projector.rotation;
  const dx = x - projector.x;
  const dy = y - projector.y;
  const dz = z - projector.z;
  out[0] = r[0]! * dx + r[1]! * dy + r[2]! * dz;
  out[1] = r[3]! * dx + r[4]! * dy + r[5]! * dz;
  out[2] = -(r[6]! * dx + r[7]! * dy + r[8]! * dz);
}

/** View to pixels in place (x right, y down, pixel centres at halves); depth is left. It must be in front of the camera. */
export function toPixels(projector: Projector, view: Float64Array): void {
  const depth = projector.perspective ? view[2]! : 1;
  const clipX = (view[0]! * projector.scaleX) / depth + projector.shiftX;
  const clipY = (view[1]! * projector.scaleY) / depth + projector.shiftY;
  view[0] = (clipX * 0.5 + 0.5) * projector.width;
  view[1] = (0.5 - clipY * 0.5) * projector.height;
}

/** World to pixels; false, with nothing of use in `out`, when the point is outside near and far. */
export function project(projector: Projector, x: number, y: number, z: number, out: Float64Array): boolean {
  toView(projector, x, y, z, out);
  if (!(out[2]! >= projector.near && out[2]! <= projector.far)) return false;
  toPixels(projector, out);
  return true;
}

/** A vertex moved by its object's world matrix, in doubles. */
export function transform(matrix: Matrix4, x: number, y: number, z: number, out: Float64Array): void {
  const m = matrix.elements;
  out[0] = m[0] * x + m[4] * y + m[8] * z + m[12];
  out[1] = m[1] * x + m[5] * y + m[9] * z + m[13];
  out[2] = m[2] * x + m[6] * y + m[10] * z + m[14];
}
