import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";

/**
 * A secret made at random once and kept in a file that only its owner reads.
 * @param {string} file
 */
export function keptSecret(file) {
  if (existsSync(file)) return readFileSync(file, "utf8");
  const secret = randomBytes(32).toString("base64url");
  // Written aside: a start that is killed here leaves no half secret.
  writeFileSync(`${file}.part`, secret, { mode: 0o600 });
  renameSync(`${file}.part`, file);
  return secret;
}
