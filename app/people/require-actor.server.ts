import type { RouterContextProvider } from "react-router";
import type { Actor } from "#app/audit/actor.ts";
import { actorContext } from "#app/context.server.ts";
import { Unauthenticated } from "#app/errors.ts";

/** The person at this request. @throws Unauthenticated */
export function requireActor(context: Readonly<RouterContextProvider>): Actor {
  const actor = context.get(actorContext);
  if (!actor) throw new Unauthenticated("Nobody is signed in.");
  return actor;
}
