import type { Object3D } from "three";
import type { LabelData } from "./extract.ts";
import { type Fonts, setLine } from "./font.ts";
import type { LabelRequest } from "./place-labels.ts";
import { type Projector, project } from "./project.ts";

/** A label ready to be placed: its point on the screen and its size, px. */
export interface LabelToPlace extends LabelRequest {
  object: Object3D;
  label: LabelData;
  /** Sizes of the two lines, px with the pixel ratio; the second is 0 without one. */
  size: number;
  subSize: number;
}

/** The second line against the first, and the height of a line against its letters. */
const SUB = 0.8;
export const LINE = 1.25;

export function measureLabel(label: LabelData, fonts: Fonts, pixelRatio: number) {
  const size = label.sizePx * pixelRatio;
  const subSize = label.sub ? Math.round(size * SUB * 4) / 4 : 0;
  const width = Math.max(
    setLine(fonts[label.face ?? "head"], label.text, size).width,
    label.sub ? setLine(fonts.body, label.sub, subSize).width : 0,
  );
  return { size, subSize, width, height: (size + subSize) * LINE };
}

/** Labels of objects in front of the camera and inside the frame. */
export function labelRequests(
  objects: readonly Object3D[],
  projector: Projector,
  fonts: Fonts,
  pixelRatio: number,
): LabelToPlace[] {
  const requests: LabelToPlace[] = [];
  for (const object of objects) {
    const label = object.userData.label as LabelData;
    const place = label.along ? lowerRight(label.along, projector) : placeOf(object, projector);
    if (!place) continue;
    const [x, y] = place;
    const offset = label.offsetPx * pixelRatio;
    const measured = measureLabel(label, fonts, pixelRatio);
    const reduced = label.sub ? measureLabel({ ...label, sub: "" }, fonts, pixelRatio) : undefined;
    requests.push({ object, label, x, y, offset, priority: label.priority, reduced, ...measured });
  }
  return requests;
}

type Place = [x: number, y: number];
const out = new Float64Array(3);

function onScreen(projector: Projector, x: number, y: number, z: number): Place | null {
  if (!project(projector, x, y, z, out)) return null;
  const [px, py] = [out[0]!, out[1]!];
  return px >= 0 && py >= 0 && px <= projector.width && py <= projector.height ? [px, py] : null;
}

function placeOf(object: Object3D, projector: Projector): Place | null {
  const world = object.matrixWorld.elements;
  return onScreen(projector, world[12], world[13], world[14]);
}

/** Of places along a line, the one in view that is farthest down and a little to the right: where readers look last. */
function lowerRight(along: ArrayLike<number>, projector: Projector): Place | null {
  let best: Place | null = null;
  for (let at = 0; at + 2 < along.length; at += 3) {
    const place = onScreen(projector, along[at]!, along[at + 1]!, along[at + 2]!);
    if (place && (!best || weight(place) > weight(best))) best = place;
  }
  return best;
}

const weight = ([x, y]: Place) => y * 1.6 + x;
