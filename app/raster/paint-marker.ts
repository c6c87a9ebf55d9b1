import type { Object3D } from "three";
import type { Rgb } from "./colour.ts";
import { coverLine } from "./lines.ts";
import { paintMask } from "./mask.ts";
import type { Canvas } from "./paint-objects.ts";
import { project } from "./project.ts";

/** What `Object3D.userData.marker` holds: a square around the object's place. px before the pixel ratio, linear light. */
export interface MarkerData {
  sizePx: number;
  widthPx: number;
  colour: Rgb;
}

const place = new Float64Array(3);

/** Paints the square, its sides on whole pixels so that they are crisp. */
export function paintMarker({ surface, mask, projector, pixelRatio }: Canvas, object: Object3D): void {
  const { sizePx, widthPx, colour } = object.userData.marker as MarkerData;
  const [, , , , , , , , , , , , x, y, z] = object.matrixWorld.elements;
  if (!project(projector, x, y, z, place)) return;
  const width = Math.max(1, Math.round(widthPx * pixelRatio));
  const half = Math.round((sizePx * pixelRatio) / 2);
  const middle = width % 2 === 0 ? 0 : 0.5;
  const [centreX, centreY] = [Math.floor(place[0]!) + middle, Math.floor(place[1]!) + middle];
  const corner = half + width / 2;
  for (const side of [-half, half]) {
    coverLine(mask, centreX - corner, centreY + side, centreX + corner, centreY + side, width);
    coverLine(mask, centreX + side, centreY - corner, centreX + side, centreY + corner, width);
  }
  paintMask(surface, mask, colour, 1);
}
