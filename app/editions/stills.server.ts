import { createHash } from "node:crypto";
import type { ExhibitContent, SceneContent } from "#app/exhibits/content.ts";
import { sceneMembers } from "#app/exhibits/scene-members.ts";
import { getObject, hasObject, putObject } from "#app/media/object-store.server.ts";
import { renderStill } from "#app/stage/still.server.ts";

const WIDTH = 1920;
const HEIGHT = 1080;

export const stillKey = (digest: string) => `stills/${digest}.png`;

/** The name of a scene's still in `edition.stills`. */
export const stillName = (sceneId: string, language: string) => `${sceneId}:${language}`;

async function keepStill(scene: SceneContent, language: "en" | "fr"): Promise<string> {
  const png = await renderStill(scene.document, sceneMembers(scene, language), {
    width: WIDTH,
    height: HEIGHT,
    language,
  });
  const digest = createHash("sha256").update(png).digest("hex");
  if (!(await hasObject(stillKey(digest)))) await putObject(stillKey(digest), png, "image/png");
  return digest;
}

/** Draws every scene in every language and keeps the pictures under their digests. */
export async function keepStills(content: ExhibitContent): Promise<Record<string, string>> {
  const stills: Record<string, string> = {};
  for (const scene of content.scenes) {
    for (const language of content.languages) stills[stillName(scene.id, language)] = await keepStill(scene, language);
  }
  return stills;
}

/** @throws NotFound */
export async function readStill(digest: string): Promise<Uint8Array> {
  return getObject(stillKey(digest));
}
