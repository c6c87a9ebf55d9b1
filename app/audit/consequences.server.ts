import type { Change, Touched } from "./change-contract.ts";

export type { Touched };

type Consequence = (change: Change, touched: readonly Touched[]) => Promise<void>;

/**
 * Rooms on the right of the shelf (review) hang their consequences here, since rooms on the left may not import them.
 * `review/register.server.ts` registers them; every process that runs verbs (server, worker, seed, tests) imports it.
 */
const consequences = new Map<string, Consequence>();

export function registerConsequence(name: string, consequence: Consequence): void {
  consequences.set(name, consequence);
}

export async function applyConsequences(change: Change, touched: readonly Touched[]): Promise<void> {
  if (touched.length === 0) return;
  if (consequences.size === 0) throw new Error("no consequences are registered: import review/register.server.ts");
  for (const consequence of consequences.values()) await consequence(change, touched);
}
