import canonicalize from "canonicalize";

/**
 * RFC 8785 (JSON Canonicalization Scheme) bytes of plain JSON data.
 * @throws TypeError for what JSON cannot say (NaN, Infinity, undefined at the top).
 */
export function canonicalBytes(value: unknown): Uint8Array {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError("only JSON data has a canonical form");
  return new TextEncoder().encode(text);
}
