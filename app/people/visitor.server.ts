import { env } from "#app/env.server.ts";
import type { Visitor } from "./sign-in.server.ts";

/**
 * Where a request comes from. X-Forwarded-For is believed only as far as our own proxies wrote it: its last entries. The
 * framework's server does not hand the socket's address on, so without a proxy all of this machine's people share one.
 */
export function visitorOf(request: Request): Visitor {
  const { TRUSTED_PROXIES } = env();
  const hops = (request.headers.get("X-Forwarded-For") ?? "").split(",").map((hop) => hop.trim());
  const address = TRUSTED_PROXIES > 0 ? (hops.at(-TRUSTED_PROXIES) ?? "") : "";
  return { address: address || "local", userAgent: request.headers.get("User-Agent") ?? "", requestId: "" };
}
