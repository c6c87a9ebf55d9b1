import type { Camera, Object3D, Scene } from "three";
import type { Rgb } from "./colour.ts";
import { extract, isPoints } from "./extract.ts";
import type { Fonts } from "./font.ts";
import { type LabelToPlace, labelRequests } from "./label-requests.ts";
import { createMask, type Mask } from "./mask.ts";
import { paintLabel } from "./paint-label.ts";
import { paintMarker } from "./paint-marker.ts";
import { type Canvas, paintObject, projectPoints } from "./paint-objects.ts";
import { paintScreen } from "./paint-screen.ts";
import { placeLabels, type Rectangle } from "./place-labels.ts";
import { projectorOf } from "./project.ts";
import { resolveFrame } from "./resolve.ts";
import { beginFrame, createSurface, type Surface } from "./surface.ts";

export interface FrameOptions {
  /** Pixels of the picture. */
  width: number;
  height: number;
  /** Multiplies every size that is given in px: stars, lines, letters. 1 unless told. */
  pixelRatio?: number;
  /** Linear light; black unless told. */
  background?: Rgb;
  /** Without fonts no label is drawn. */
  fonts?: Fonts | null;
  /** Rectangles, px, that labels stay out of. */
  keepOut?: readonly Rectangle[];
  /** What an earlier frame of the same size and background returned in `memory`: drawn over, not made anew. */
  memory?: FrameMemory;
}

export interface FrameMemory {
  surface: Surface;
  mask: Mask;
}

export interface PlacedLabel extends Rectangle {
  object: Object3D;
  text: string;
}

export interface Frame {
  /** RGBA, sRGB, opaque, row by row from the top. Belongs to `memory`. */
  data: Uint8ClampedArray<ArrayBuffer>;
  width: number;
  height: number;
  labels: PlacedLabel[];
  memory: FrameMemory;
}

/**
 * Draws one frame of a three.js scene graph: lines and points in render order, then labels, then screen groups. The
 * world matrices of scene and camera are brought up to date. No clock, no chance: the same scene gives the same bytes.
 * @throws RangeError for a size that is no whole number of pixels
 */
export function renderFrame(scene: Scene, camera: Camera, options: FrameOptions): Frame {
  const { width, height, pixelRatio = 1, background = [0, 0, 0], fonts, keepOut = [] } = options;
  const memory = options.memory ?? {
    surface: createSurface(width, height, background),
    mask: createMask(width, height),
  };
  scene.updateMatrixWorld();
  camera.updateMatrixWorld();
  const canvas: Canvas = { ...memory, projector: projectorOf(camera, width, height), pixelRatio };
  beginFrame(memory.surface);
  const { drawn, labelled, marked, screens } = extract(scene);
  for (const object of drawn) paintObject(canvas, object);
  for (const object of marked) paintMarker(canvas, object);
  const taken = fonts ? screens.flatMap((screen) => paintScreen(canvas, screen, fonts)) : [];
  const labels = fonts ? paintLabels(canvas, labelled, fonts, [...keepOut, ...taken, ...starCores(canvas, drawn)]) : [];
  resolveFrame(memory.surface);
  return { data: memory.surface.bytes, width, height, labels, memory };
}

/** Room between two labels side by side, px before the pixel ratio. */
const GAP_PX = 6;

function paintLabels(canvas: Canvas, objects: Object3D[], fonts: Fonts, keepOut: Rectangle[]): PlacedLabel[] {
  const requests: LabelToPlace[] = labelRequests(objects, canvas.projector, fonts, canvas.pixelRatio);
  return placeLabels(requests, canvas.surface, keepOut, GAP_PX * canvas.pixelRatio).map(
    ({ request, isReduced, ...box }) => {
      const { label, size, subSize } = request;
      paintLabel(canvas, fonts, { label: isReduced ? { ...label, sub: "" } : label, size, subSize }, box.left, box.top);
      return { object: request.object, text: request.label.text, ...box };
    },
  );
}

/** Names never cover a star. Only of points that say so (userData.keepOut): a background of thousands leaves no room. */
function starCores({ projector, pixelRatio }: Canvas, drawn: Object3D[]): Rectangle[] {
  return drawn.filter(isPoints).flatMap((points) => {
    if (!points.userData.keepOut) return [];
    const size = points.geometry.getAttribute("starSize");
    const places = projectPoints(projector, points);
    return Array.from({ length: places.length / 3 }, (_, at) => {
      const half = (size ? size.getX(at) : 1) * pixelRatio;
      const [x, y] = [places[at * 3]!, places[at * 3 + 1]!];
      return { left: x - half, top: y - half, right: x + half, bottom: y + half };
    }).filter((_, at) => !Number.isNaN(places[at * 3 + 2]));
  });
}
