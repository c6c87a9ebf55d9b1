import { answeredApi } from "#app/http.server.ts";
import { readVariant } from "#app/media/read-media.server.ts";
import type { Route } from "./+types/picture";

/** GET /pictures/<digest>.<format>: one variant of a picture. Its address is its content, so it never goes stale. */
export const loader = answeredApi(async ({ params }: Route.LoaderArgs) => {
  const [digest = "", format = ""] = params.file.split(".");
  const found = await readVariant(digest, format);
  return new Response(new Uint8Array(found.bytes), {
    headers: {
      "Content-Type": `image/${found.format}`,
      "Cache-Control": "public, max-age=31536000, immutable",
      ETag: `"${digest}"`,
    },
  });
});
