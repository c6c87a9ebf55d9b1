import type { Object3D, Points } from "three";
import { binByTile } from "./bin.ts";
import { isLine, isPoints, type LineObject, segmentsOf } from "./extract.ts";
import { coverSegment } from "./lines.ts";
import { type Mask, paintMask } from "./mask.ts";
import { type Projector, project, transform } from "./project.ts";
import { splat } from "./splat.ts";
import type { Surface } from "./surface.ts";

export interface Canvas {
  surface: Surface;
  mask: Mask;
  projector: Projector;
  pixelRatio: number;
}

export function paintObject(canvas: Canvas, object: Object3D): void {
  if (isLine(object)) paintLine(canvas, object);
  else if (isPoints(object)) paintPoints(canvas, object);
}

/** userData.widthPx, else the material's linewidth, px before the pixel ratio. */
export function lineWidth(line: LineObject): number {
  return typeof line.userData.widthPx === "number" ? line.userData.widthPx : (line.material.linewidth ?? 1);
}

function paintLine({ surface, mask, projector, pixelRatio }: Canvas, line: LineObject): void {
  const position = line.geometry.getAttribute("position");
  const { color, opacity = 1 } = line.material;
  const width = lineWidth(line) * pixelRatio;
  const from = new Float64Array(3);
  const to = new Float64Array(3);
  for (const [first, second] of segmentsOf(line)) {
    transform(line.matrixWorld, position.getX(first), position.getY(first), position.getZ(first), from);
    transform(line.matrixWorld, position.getX(second), position.getY(second), position.getZ(second), to);
    coverSegment(mask, projector, from, to, width);
  }
  paintMask(surface, mask, color ? [color.r, color.g, color.b] : [1, 1, 1], opacity);
}

/** Where the points of an object stand on the screen: x, y, depth a vertex; depth NaN where it is not in view. */
export function projectPoints(projector: Projector, points: Points): Float64Array {
  const position = points.geometry.getAttribute("position");
  const places = new Float64Array(position.count * 3);
  const place = new Float64Array(3);
  for (let at = 0; at < places.length; at += 3) {
    const vertex = at / 3;
    transform(points.matrixWorld, position.getX(vertex), position.getY(vertex), position.getZ(vertex), place);
    const seen = project(projector, place[0]!, place[1]!, place[2]!, place);
    places[at] = place[0]!;
    places[at + 1] = place[1]!;
    places[at + 2] = seen ? place[2]! : Number.NaN;
  }
  return places;
}

function paintPoints({ surface, projector, pixelRatio }: Canvas, points: Points): void {
  const colour = points.geometry.getAttribute("color");
  const size = points.geometry.getAttribute("starSize");
  const places = projectPoints(projector, points);
  const material = points.material as { color?: { r: number; g: number; b: number }; size?: number };
  const plain = material.color ?? { r: 1, g: 1, b: 1 };
  for (const at of binByTile(places, surface)) {
    splat(
      surface,
      places[at * 3]!,
      places[at * 3 + 1]!,
      (size ? size.getX(at) : (material.size ?? 1)) * pixelRatio,
      colour ? colour.getX(at) : plain.r,
      colour ? colour.getY(at) : plain.g,
      colour ? colour.getZ(at) : plain.b,
    );
  }
}
