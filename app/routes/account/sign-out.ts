import { redirect } from "react-router";
import { actorContext } from "#app/context.server.ts";
import { answeredApi, methodNotAllowed } from "#app/http.server.ts";
import { clearSessionToken } from "#app/people/session-cookie.server.ts";
import { signOut } from "#app/people/sign-out.server.ts";
import type { Route } from "./+types/sign-out";

/** Looking at the address signs nobody out. */
export function loader() {
  return redirect("/desk");
}

export const action = answeredApi(async ({ request, context }: Route.ActionArgs) => {
  if (request.method !== "POST") return methodNotAllowed("POST");
  const actor = context.get(actorContext);
  if (actor) await signOut(actor);
  return redirect("/sign-in?said=signed-out", { headers: { "Set-Cookie": await clearSessionToken() } });
});
