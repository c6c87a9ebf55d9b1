import { Object3D, Scene } from "three";
import type { LaidStar, VolumeLayout } from "#app/scene/layout.ts";
import { label, lights, loop, segments } from "./graph-parts.ts";
import { RING, RING_LABEL, STARLIGHT, STARLIGHT_SOFT, STEM, VERMILION } from "./night.ts";

/** Corners of a ring: no corner shows at the size of a wall screen. */
const CORNERS = 192;

/** The Points that can be chosen carry this name, and the records' ids in userData.recordIds. */
export const CAST = "cast";

/**
 * The three.js scene of a volume: rings in the Galactic plane, stems down to it, error bars along the line of sight, the
 * Sun, the cast, and their names. Whether error bars are drawn is the caller's to say: the layout has them always.
 */
export function buildVolumeGraph(
  layout: VolumeLayout,
  { selectedId, errorBars = true }: { selectedId?: string | null; errorBars?: boolean } = {},
): Scene {
  const scene = new Scene();
  for (const ring of layout.rings) scene.add(...ringOf(ring));
  scene.add(segments(layout.stars.flatMap(stem), { colour: STEM, widthPx: 1 }));
  if (errorBars) {
    const ends = layout.stars.flatMap(({ low, high }) => [...low, ...high]);
    scene.add(segments(ends, { colour: VERMILION, widthPx: 2, opacity: 0.9 }));
  }
  scene.add(lights([{ position: [0, 0, 0], ...layout.sun }]));
  scene.add(sunLabel(layout));
  scene.add(cast(layout.stars));
  for (const star of layout.stars) scene.add(...nameOf(star, star.recordId === selectedId));
  return scene;
}

function ringOf({ radius, label: text }: VolumeLayout["rings"][number]): Object3D[] {
  const corners = Array.from({ length: CORNERS }, (_, corner) => {
    const angle = (corner / CORNERS) * 2 * Math.PI;
    return [Math.cos(angle) * radius, Math.sin(angle) * radius, 0];
  }).flat();
  const data = {
    text,
    sizePx: 12,
    colour: RING_LABEL,
    priority: 0,
    offsetPx: 5,
    face: "body",
    along: corners,
  } as const;
  return [loop(corners, { colour: RING, widthPx: 1 }), label([0, 0, 0], data)];
}

function stem({ position: [x, y, z] }: LaidStar): number[] {
  return [x, y, z, x, y, 0];
}

function sunLabel({ sun }: VolumeLayout): Object3D {
  return label([0, 0, 0], { text: sun.name, sizePx: 13, colour: STARLIGHT_SOFT, priority: 5, offsetPx: 8 });
}

function cast(stars: readonly LaidStar[]): Object3D {
  const points = lights(stars);
  points.name = CAST;
  points.userData.pick = true;
  points.userData.recordIds = stars.map(({ recordId }) => recordId);
  return points;
}

function nameOf(star: LaidStar, selected: boolean): Object3D[] {
  const objects: Object3D[] = [];
  if (star.label || selected) {
    const data = {
      text: star.label || star.name,
      sub: star.distanceText,
      sizePx: 17,
      colour: selected ? STARLIGHT : STARLIGHT_SOFT,
      subColour: STARLIGHT_SOFT,
      priority: selected ? 100 : 10 + star.sizePx,
      offsetPx: star.sizePx + 8,
    };
    objects.push(label(star.position, data));
  }
  if (selected) {
    const marker = new Object3D();
    marker.position.set(...star.position);
    marker.userData.marker = { sizePx: 2 * star.sizePx + 14, widthPx: 1.5, colour: STARLIGHT };
    objects.push(marker);
  }
  return objects;
}
