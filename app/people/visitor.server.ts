import { isIPv6 } from "node:net";
import type { RouterContextProvider } from "react-router";
import { actorContext, requestIdContext } from "#app/context.server.ts";
import { env } from "#app/env.server.ts";
import { socketAddress } from "./socket-address.server.ts";

/** From where somebody asks who is not signed in yet, or is about to be again. */
export interface Visitor {
  address: string;
  userAgent: string;
  requestId: string;
  /** The session that this browser holds already; a new sign-in ends it. */
  sessionId: string | null;
}

export function visitorOf(request: Request, context: Readonly<RouterContextProvider>): Visitor {
  return {
    address: addressOf(request.headers.get("X-Forwarded-For"), socketAddress(), env().TRUSTED_PROXIES),
    userAgent: request.headers.get("User-Agent") ?? "",
    requestId: context.get(requestIdContext),
    sessionId: context.get(actorContext)?.sessionId ?? null,
  };
}

/** X-Forwarded-For is believed only as far as our own proxies wrote it: its last entries. Otherwise the socket counts. */
export function addressOf(forwardedFor: string | null, socket: string, proxies: number): string {
  const hops = (forwardedFor ?? "").split(",").map((hop) => hop.trim());
  const address = (proxies > 0 ? hops.at(-proxies) : "") || socket;
  return address.replace(/^::ffff:(?=\d+\.)/i, "") || "unknown";
}

/** What a limit by address counts as one: an IPv4 address, or the /64 of which one IPv6 customer holds every address. */
export function neighbourhood(address: string): string {
  if (!isIPv6(address)) return address;
  const [left = "", right] = address.split("%")[0]?.split("::") ?? [];
  const before = left ? left.split(":") : [];
  const after = right ? right.split(":") : [];
  const zeros = right === undefined ? 0 : 8 - before.length - after.length;
  const groups = [...before, ...Array<string>(zeros).fill("0"), ...after].slice(0, 4);
  return `${groups.map((group) => Number.parseInt(group, 16).toString(16)).join(":")}::/64`;
}
