import { answeredApi } from "#app/http.server.ts";
import { readVariant } from "#app/media/read-media.server.ts";
import type { Route } from "./+types/picture";

/** GET /pictures/<digest>.<format>: one variant of a picture. Its address is its content, so it never goes stale. */
export const loader = answeredApi(async ({ params, request }: Route.LoaderArgs) => {
  const [digest = "", format = "", ...more] = params.file.split(".");
  const found = await readVariant(digest, more.length === 0 ? format : "");
  const headers = { "Cache-Control": "public, max-age=31536000, immutable", ETag: `"${digest}"` };
  if (request.headers.get("If-None-Match")?.includes(digest)) return new Response(null, { status: 304, headers });
  return new Response(new Uint8Array(found.bytes), {
    headers: { ...headers, "Content-Type": `image/${found.format}` },
  });
});
