import { data, redirect } from "react-router";
import { env } from "#app/env.server.ts";
import { isThemeChoice, pathHere, themeCookie } from "#app/ui/theme-choice.ts";
import type { Route } from "./+types/theme";

/** Keeps a person's choice of light and goes back to where they were. */
export async function action({ request }: Route.ActionArgs) {
  const form = await request.formData();
  const choice = form.get("theme");
  if (!isThemeChoice(choice)) throw data({ detail: "That is not one of the choices." }, 400);
  const secure = env().PUBLIC_URL.startsWith("https:");
  return redirect(pathHere(form.get("here")), { headers: { "Set-Cookie": themeCookie(choice, secure) } });
}

export function loader() {
  return redirect("/");
}
