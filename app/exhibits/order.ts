import { Conflict } from "#app/errors.ts";

/**
 * An order must name exactly the members there are.
 * @throws Conflict when one was added or removed since the order was made.
 */
export function assertSameMembers(present: string[], order: string[]): void {
  const same = present.length === order.length && new Set(order).size === order.length;
  if (same && present.every((id) => order.includes(id))) return;
  throw new Conflict("Something was added or removed while you were putting it in order. Load the page again.");
}
