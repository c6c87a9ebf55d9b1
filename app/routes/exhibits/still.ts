import { readScene } from "#app/exhibits/read-scene.server.ts";
import { sceneMembers } from "#app/exhibits/scene-members.ts";
import { answeredApi } from "#app/http.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { renderStill } from "#app/stage/still.server.ts";
import type { Route } from "./+types/still";

/** GET .../still.png?language=: the scene as it stands now, for the builder and the review. */
export const loader = answeredApi(async ({ context, params, request }: Route.LoaderArgs) => {
  const { resolved } = await readScene(requireActor(context), params.exhibit, params.scene);
  const language = new URL(request.url).searchParams.get("language") === "fr" ? "fr" : "en";
  const size = { width: 1280, height: 720, language } as const;
  const png = await renderStill(resolved.document, sceneMembers(resolved, language), size);
  return new Response(new Uint8Array(png), { headers: { "Content-Type": "image/png" } });
});
