import { createCookie } from "react-router";
import { env } from "#app/env.server.ts";

/** On https the cookie is bound to this host and cannot be set from a neighbour (`__Host-`). */
export function sessionCookieName(publicUrl: string): string {
  return publicUrl.startsWith("https:") ? "__Host-alidade" : "alidade";
}

function sessionCookie() {
  const { PUBLIC_URL } = env();
  return createCookie(sessionCookieName(PUBLIC_URL), {
    httpOnly: true,
    sameSite: "lax",
    path: "/",
    secure: PUBLIC_URL.startsWith("https:"),
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
