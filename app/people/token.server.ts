import { createHash, createHmac, randomBytes } from "node:crypto";
import { env } from "#app/env.server.ts";

/** 256 random bits for a cookie or a link. */
export function newToken(): string {
  return randomBytes(32).toString("base64url");
}

/** What the database keeps of a token: keyed, so that a copy of the table alone opens nothing. */
export function tokenHash(token: string): string {
  return createHmac("sha256", env().SESSION_SECRET).update(token).digest("hex");
}

/** A stable name for an address or account in the limiter's table, which does not need to read it. */
export function limiterKey(text: string): string {
  return createHash("sha256").update(text.trim().toLowerCase()).digest("hex").slice(0, 40);
}
