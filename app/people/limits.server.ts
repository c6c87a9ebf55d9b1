import { RateLimiterMySQL, RateLimiterRes } from "rate-limiter-flexible";
import { connections } from "#app/database/db.server.ts";
import { TooMany } from "#app/errors.ts";
import { limiterKey } from "./token.server.ts";

/** Attempts within a window, by account and by address. The table is made by our migrations, not by the library. */
const RULES = {
  "sign-in-account": { points: 10, duration: 15 * 60 },
  "sign-in-address": { points: 60, duration: 15 * 60 },
  "reset-account": { points: 3, duration: 60 * 60 },
  "reset-address": { points: 20, duration: 60 * 60 },
} as const;

export type LimitName = keyof typeof RULES;

const limiters = new Map<LimitName, RateLimiterMySQL>();

function limiter(name: LimitName): RateLimiterMySQL {
  const known = limiters.get(name);
  if (known) return known;
  const made = new RateLimiterMySQL({
    // The pool's promise face hides the plain one that the library speaks to.
    storeClient: (connections() as unknown as { pool: unknown }).pool,
    storeType: "pool",
    dbName: databaseName(),
    tableName: "attempt_limit",
    tableCreated: true,
    keyPrefix: name,
    ...RULES[name],
  });
  limiters.set(name, made);
  return made;
}

function databaseName(): string {
  const { config } = connections().pool as unknown as { config: { connectionConfig: { database: string } } };
  return config.connectionConfig.database;
}

/**
 * Counts one attempt. The same answer whether the account exists or not.
 * @throws TooMany with when to come back
 */
export async function countAttempt(name: LimitName, who: string): Promise<void> {
  try {
    await limiter(name).consume(limiterKey(who));
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    const seconds = Math.max(1, Math.ceil(refusal.msBeforeNext / 1000));
    throw new TooMany(`Too many attempts. Try again in ${waitWords(seconds)}.`, seconds);
  }
}

function waitWords(seconds: number): string {
  const minutes = Math.ceil(seconds / 60);
  return minutes <= 1 ? "a minute" : `${minutes} minutes`;
}

/** A success wipes the account's slate. */
export async function forgetAttempts(name: LimitName, who: string): Promise<void> {
  await limiter(name).delete(limiterKey(who));
}

/** A success was no guess: that one attempt is given back, the others stay counted. */
export async function forgiveAttempt(name: LimitName, who: string): Promise<void> {
  await limiter(name).reward(limiterKey(who), 1);
}
