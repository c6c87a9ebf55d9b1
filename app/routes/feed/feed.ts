import { createHash } from "node:crypto";
import { feedOf } from "#app/editions/feed.ts";
import { readNewestEdition } from "#app/editions/read-newest.server.ts";
import { env } from "#app/env.server.ts";
import { answeredApi } from "#app/http.server.ts";
import type { Route } from "./+types/feed";

/** GET /feed/<exhibit>.json: the newest edition, with a strong ETag; 304 where the asker has it. */
export const loader = answeredApi(async ({ params, request }: Route.LoaderArgs) => {
  const edition = await readNewestEdition(params.exhibit);
  const body = JSON.stringify(feedOf(params.exhibit, edition, env().PUBLIC_URL));
  const tag = `"${createHash("sha256").update(body).digest("hex")}"`;
  const headers = { ETag: tag, "Cache-Control": "public, no-cache" };
  const known = request.headers
    .get("If-None-Match")
    ?.split(",")
    .map((one) => one.trim().replace(/^W\//, ""));
  if (known?.includes(tag) || known?.includes("*")) return new Response(null, { status: 304, headers });
  return new Response(body, { headers: { ...headers, "Content-Type": "application/feed+json; charset=utf-8" } });
});
