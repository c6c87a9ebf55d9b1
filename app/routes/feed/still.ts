import { readStill } from "#app/editions/stills.server.ts";
import { NotFound } from "#app/errors.ts";
import { answeredApi } from "#app/http.server.ts";
import type { Route } from "./+types/still";

/** GET /stills/<digest>.png: a still of an edition. Its address is its content, so it never goes stale. */
export const loader = answeredApi(async ({ params }: Route.LoaderArgs) => {
  if (!/^[0-9a-f]{64}$/.test(params.digest)) throw new NotFound("There is no such still.");
  const png = await readStill(params.digest);
  return new Response(new Uint8Array(png), {
    headers: {
      "Content-Type": "image/png",
      "Cache-Control": "public, max-age=31536000, immutable",
      ETag: `"${params.digest}"`,
    },
  });
});
