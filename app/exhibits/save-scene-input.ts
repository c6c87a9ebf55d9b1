import { z } from "zod";
import { SceneDocument } from "#app/scene/document.ts";
import { AddScene, version } from "./exhibit-input.ts";

export const SaveScene = AddScene.omit({ exhibitId: true }).extend({
  sceneId: z.string(),
  version,
  document: SceneDocument,
});
