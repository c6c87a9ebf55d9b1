import { parseInput } from "#app/parse-input.ts";
import { SaveScene } from "./save-scene-input.ts";

const CAMERA = ["azimuthDeg", "elevationDeg", "distance", "fovDeg"] as const;

/** Reads the scene's form, whose fields are named by their place in the document ("document.camera.fovDeg"). @throws Invalid */
export function sceneFromForm(form: FormData) {
  const text = (name: string) => form.get(name) ?? undefined;
  const ticked = (name: string) => form.get(name) !== null;
  return parseInput(SaveScene, {
    sceneId: text("sceneId"),
    version: text("version"),
    titleEn: text("titleEn"),
    titleFr: text("titleFr"),
    document: {
      kind: "volume",
      mapping: text("document.mapping"),
      unit: text("document.unit"),
      rings: ticked("document.rings") ? "auto" : "none",
      errorBars: ticked("document.errorBars"),
      labels: ticked("document.labels"),
      camera: Object.fromEntries(CAMERA.map((name) => [name, text(`document.camera.${name}`)])),
    },
  });
}
