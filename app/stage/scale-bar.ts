import { Group, type PerspectiveCamera, type Scene, Vector3 } from "three";
import { convertLength } from "#app/astrometry/units.ts";
import type { Language } from "#app/figures/language.ts";
import { scaleText } from "#app/figures/scale-text.ts";
import { claimsSentence } from "#app/scene/claims.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import type { VolumeLayout } from "#app/scene/layout.ts";
import { roundLengthBelow } from "#app/scene/round-lengths.ts";
import { label, segments } from "./graph-parts.ts";
import { STARLIGHT_SOFT } from "./night.ts";
import { STAGE_WORDS } from "./words.ts";

const NAME = "scale-bar";
const MARGIN_PX = 28;
const LONGEST_PX = 220;

interface View {
  document: SceneDocument;
  layout: VolumeLayout;
  language: Language;
  camera: PerspectiveCamera;
  /** Height of the picture in px before the pixel ratio. */
  heightPx: number;
}

/** px that one scene unit takes at the Sun's distance from the eye; null when the Sun is not in front of it. */
export function pixelsPerUnitAtSun(camera: PerspectiveCamera, heightPx: number): number | null {
  const depth = -new Vector3().applyMatrix4(camera.matrixWorldInverse).z;
  return depth > camera.near ? heightPx / (2 * Math.tan((camera.fov * Math.PI) / 360) * depth) : null;
}

/**
 * Puts the bar of this view into the scene, bottom right, in place of an earlier one: a round length that fits, and what
 * the scene may claim. Where the scale is not linear, how it stretches stands in the bar's place; where the Sun is behind
 * the eye, the claim stands alone.
 */
export function putScaleBar(scene: Scene, view: View): void {
  const old = scene.getObjectByName(NAME);
  if (old) scene.remove(old);
  const group = new Group();
  group.name = NAME;
  group.userData.screen = "bottom-right";
  const claim = claimsSentence(view.layout.claims, view.language);
  const bar = view.layout.scaleBar && barOf(view);
  const scale = bar ? bar.text : view.layout.stretchText;
  group.add(caption(scale ? [scale, claim] : [claim]));
  if (bar) {
    const [left, right, y] = [-MARGIN_PX - bar.lengthPx, -MARGIN_PX, -MARGIN_PX - 52];
    const ends = [left, y, 0, right, y, 0, left, y - 5, 0, left, y + 5, 0, right, y - 5, 0, right, y + 5, 0];
    group.add(segments(ends, { colour: STARLIGHT_SOFT, widthPx: 1.25 }));
  }
  scene.add(group);
}

function barOf({ document, language, camera, heightPx }: View): { lengthPx: number; text: string } | null {
  const perUnit = pixelsPerUnitAtSun(camera, heightPx);
  if (!perUnit) return null;
  const most = convertLength(LONGEST_PX / perUnit, "pc", document.unit);
  if (!Number.isFinite(most) || most <= 0) return null;
  const length = roundLengthBelow(most);
  const text = STAGE_WORDS[language].whereSunStands(scaleText(length, document.unit, language));
  return { lengthPx: convertLength(length, document.unit, "pc") * perUnit, text };
}

/** One label a line, so that each ends at the margin. */
function caption(lines: string[]): Group {
  const group = new Group();
  for (const [at, text] of lines.entries()) {
    const y = -MARGIN_PX - (lines.length - at) * 19;
    const look = {
      sizePx: 13.5,
      colour: STARLIGHT_SOFT,
      priority: 0,
      offsetPx: 0,
      face: "body",
      align: "right",
    } as const;
    group.add(label([-MARGIN_PX, y, 0], { text, ...look }));
  }
  return group;
}
