import { createCookie } from "react-router";
import { env } from "#app/env.server.ts";

/** On https the cookie is bound to this host and cannot be set from a neighbour (`__Host-`). */
function sessionCookieName(publicUrl: string): string {
  return publicUrl.startsWith("https:") ? "__Host-alidade" : "alidade";
}

export function sessionCookie(publicUrl = env().PUBLIC_URL) {
  return createCookie(sessionCookieName(publicUrl), {
    httpOnly: true,
    sameSite: "lax",
    path: "/",
    secure: publicUrl.startsWith("https:"),
  });
}

export async function readSessionToken(request: Request): Promise<string | null> {
  const token: unknown = await sessionCookie().parse(request.headers.get("Cookie"));
  return typeof token === "string" && token ? token : null;
}

export async function setSessionToken(token: string, expires: Date): Promise<string> {
  return sessionCookie().serialize(token, { expires });
}

export async function clearSessionToken(): Promise<string> {
  return sessionCookie().serialize("", { maxAge: 0 });
}
