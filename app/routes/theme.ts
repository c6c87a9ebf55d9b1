import { redirect } from "react-router";
import { env } from "#app/env.server.ts";
import { Invalid } from "#app/errors.ts";
import { answeredApi, methodNotAllowed, readForm } from "#app/http.server.ts";
import { isThemeChoice, pathHere, themeCookie } from "#app/ui/theme-choice.ts";
import type { Route } from "./+types/theme";

/** Keeps a person's choice of light and goes back to where they were. */
export const action = answeredApi(async ({ request }: Route.ActionArgs) => {
  if (request.method !== "POST") return methodNotAllowed("POST");
  const form = await readForm(request);
  const choice = form.get("theme");
  if (!isThemeChoice(choice)) throw new Invalid({ theme: ["That is not one of the choices."] });
  const secure = env().PUBLIC_URL.startsWith("https:");
  return redirect(pathHere(form.get("here")), { headers: { "Set-Cookie": themeCookie(choice, secure) } });
});

export function loader() {
  return redirect("/");
}
