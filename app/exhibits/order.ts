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

/** The order with one member moved a place earlier (-1) or later (+1); unchanged at the ends. @throws Conflict */
export function movedInOrder(order: readonly string[], id: string, by: -1 | 1): string[] {
  const from = order.indexOf(id);
  if (from < 0) throw new Conflict("It is not there any more. Load the page again.");
  const to = from + by;
  if (to < 0 || to >= order.length) return [...order];
  const moved = [...order];
  moved.splice(from, 1);
  moved.splice(to, 0, id);
  return moved;
}
