import { createHash } from "node:crypto";
import { canonicalBytes } from "./canonical.ts";

export interface Sealable {
  /** Canonical JSON, exactly the bytes that are kept. */
  content: Buffer;
  /** SHA-256 of `content`, 64 hex digits. */
  digest: string;
}

export function sealable(value: unknown): Sealable {
  const content = Buffer.from(canonicalBytes(value));
  return { content, digest: createHash("sha256").update(content).digest("hex") };
}
