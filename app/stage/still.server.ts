import sharp from "sharp";
import type { Language } from "#app/figures/language.ts";
import { renderFrame } from "#app/raster/frame.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import { layoutVolume } from "#app/scene/layout.ts";
import type { CastMember } from "#app/scene/member.ts";
import { cameraFor, type Orbit } from "./camera.ts";
import { stageFonts } from "./fonts.server.ts";
import { NIGHT } from "./night.ts";
import { putScaleBar } from "./scale-bar.ts";
import { buildVolumeGraph } from "./volume-graph.ts";

/** Sizes in px are meant for a picture whose shorter side is this; larger pictures have larger letters. */
const SHORTER_SIDE = 720;

export interface StillOptions {
  width: number;
  height: number;
  language: Language;
  selectedId?: string | null;
  view?: Partial<Orbit>;
}

/**
 * A scene as a PNG, drawn by the same rasteriser as on a kiosk: the same content gives the same bytes.
 * Those who cannot be placed are left out, as in the layout.
 */
export async function renderStill(
  document: SceneDocument,
  members: readonly CastMember[],
  options: StillOptions,
): Promise<Buffer> {
  const { width, height, language, selectedId, view } = options;
  const layout = layoutVolume(document, members, language);
  const scene = buildVolumeGraph(layout, { selectedId, errorBars: document.errorBars });
  const camera = cameraFor(document, layout, width / height, view);
  const pixelRatio = Math.min(width, height) / SHORTER_SIDE;
  putScaleBar(scene, { document, layout, language, camera, heightPx: height / pixelRatio });
  const { data } = renderFrame(scene, camera, { width, height, pixelRatio, background: NIGHT, fonts: stageFonts() });
  return sharp(data, { raw: { width, height, channels: 4 } })
    .removeAlpha()
    .png({ compressionLevel: 6 })
    .toBuffer();
}
