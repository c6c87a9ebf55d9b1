import { type Algorithm, hash, verify } from "@node-rs/argon2";

/** argon2id with 19 MiB, two passes, one lane: the first choice of OWASP's password storage cheat sheet (from memory). */
const SETTINGS = { algorithm: 2 as Algorithm.Argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export async function hashPassword(password: string): Promise<string> {
  return hash(password, SETTINGS);
}

let decoy: Promise<string> | undefined;

/**
 * Compares a password with a stored hash. Without one (no such account, or not yet invited in) the same work is done
 * against a decoy, so that the time taken tells nothing.
 */
export async function passwordMatches(stored: string | null | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword("nobody's password");
  // Awaited in either case: the first comparison of a process makes it, and must not tell by that.
  const nobodys = await decoy;
  const matches = await verify(stored ?? nobodys, password);
  return matches && Boolean(stored);
}
