import { Canvas, useThree } from "@react-three/fiber";
import { useEffect, useLayoutEffect, useMemo, useRef, useState } from "react";
import type { PerspectiveCamera } from "three";
import type { Language } from "#app/figures/language.ts";
import { RasterRenderer } from "#app/raster/raster-renderer.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import type { VolumeLayout } from "#app/scene/layout.ts";
import { cameraFor, type Orbit } from "./camera.ts";
import { NIGHT } from "./night.ts";
import { putScaleBar } from "./scale-bar.ts";
import { useFonts } from "./use-fonts.ts";
import { buildVolumeGraph, CAST } from "./volume-graph.ts";

/** The record under a place of the canvas, css px, or null. */
export type PickRecord = (x: number, y: number, radiusPx: number) => string | null;

interface StageCanvasProps {
  document: SceneDocument;
  layout: VolumeLayout;
  language: Language;
  selectedId: string | null;
  orbit: Orbit;
  /** Letters grow with the screen, as they do in a still. */
  large: boolean;
  /** Told once the stage can draw, with the way to ask what is where. */
  onReady: (pick: PickRecord) => void;
}

/** The canvas itself: three's scene graph, drawn by our rasteriser when something has changed and only then. */
export default function StageCanvas(props: StageCanvasProps) {
  const fonts = useFonts();
  const renderer = useRef<RasterRenderer | null>(null);
  const { onReady } = props;
  const [failure, setFailure] = useState<unknown>(null);
  useEffect(() => {
    if (fonts) onReady((x, y, radius) => recordAt(renderer.current, x, y, radius));
  }, [fonts, onReady]);
  if (failure !== null) throw failure;
  if (!fonts) return null;
  return (
    <Canvas
      frameloop="demand"
      dpr={[1, 2]}
      flat
      events={undefined}
      aria-hidden="true"
      gl={({ canvas }) => {
        const made = new RasterRenderer({ canvas: canvas as HTMLCanvasElement, background: NIGHT, fonts });
        renderer.current = tellFailure(made, setFailure);
        return renderer.current;
      }}
    >
      <View {...props} />
    </Canvas>
  );
}

/** Frames are drawn outside React, which would not hear of an error there, and the next frame would fail again. */
function tellFailure(renderer: RasterRenderer, onFailure: (failure: unknown) => void): RasterRenderer {
  const draw = renderer.render.bind(renderer);
  renderer.render = (scene, camera) => {
    try {
      draw(scene, camera);
    } catch (error) {
      onFailure(error ?? new Error("the stage could not be drawn"));
    }
  };
  return renderer;
}

function recordAt(renderer: RasterRenderer | null, x: number, y: number, radiusPx: number): string | null {
  const picked = renderer?.pickAt(x, y, radiusPx);
  const recordIds = picked?.name === CAST ? (picked.userData.recordIds as string[]) : [];
  return picked ? (recordIds[picked.index] ?? null) : null;
}

const SHORTER_SIDE = 720;

function View({ document, layout, language, selectedId, orbit, large }: StageCanvasProps) {
  const set = useThree((state) => state.set);
  const gl = useThree((state) => state.gl) as unknown as RasterRenderer;
  const invalidate = useThree((state) => state.invalidate);
  const { width, height } = useThree((state) => state.size);
  const { errorBars } = document;
  const graph = useMemo(() => buildVolumeGraph(layout, { selectedId, errorBars }), [layout, selectedId, errorBars]);
  useLayoutEffect(() => {
    if (width === 0 || height === 0) return;
    const camera: PerspectiveCamera = cameraFor(document, layout, width / height, orbit);
    gl.scale = large ? Math.max(1, Math.min(width, height) / SHORTER_SIDE) : 1;
    putScaleBar(graph, { document, layout, language, camera, heightPx: height / gl.scale });
    set({ camera: Object.assign(camera, { manual: true }) });
    invalidate();
  }, [document, layout, language, orbit, large, graph, width, height, gl, set, invalidate]);
  return <primitive object={graph} />;
}
