import type { Actor } from "#app/audit/actor.ts";
import { Forbidden, Unauthenticated } from "#app/errors.ts";
import { mayDo, PERMISSIONS, type Permission } from "./permissions.ts";

/**
 * The first line of every verb.
 * @throws Unauthenticated when nobody is signed in, Forbidden when no role of theirs allows it.
 */
export function authorise(actor: Actor | null, permission: Permission): asserts actor is Actor {
  if (!actor) throw new Unauthenticated("Nobody is signed in.");
  if (mayDo(actor.roles, permission)) return;
  throw new Forbidden(`This takes the role ${PERMISSIONS[permission].join(" or ")}; you do not hold it.`);
}
