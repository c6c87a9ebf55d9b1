import { redirect } from "react-router";
import { requestIdContext } from "#app/context.server.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { resetPassword } from "#app/people/choose-password.server.ts";
import { ChoosePassword } from "#app/people/input.ts";
import { readLink } from "#app/people/one-time-link.server.ts";
import { errorTitle } from "../RouteError.tsx";
import type { Route } from "./+types/reset-password";
import { Gate } from "./Gate.tsx";
import { PasswordForm } from "./PasswordForm.tsx";
import { SpentLink } from "./SpentLink.tsx";

export const meta: Route.MetaFunction = ({ error }) => [
  { title: error ? errorTitle(error) : "Choose a new password · Alidade" },
  // The address holds a secret: it is not told to other places. (Our own origin check needs the Origin header.)
  { name: "referrer", content: "same-origin" },
];

export const loader = answered(({ params }: Route.LoaderArgs) => readLink(params.token, "password-reset"));

export const action = answeredAction(async ({ request, params, context }: Route.ActionArgs) => {
  const { password, again } = Object.fromEntries(await readForm(request));
  const input = parseInput(ChoosePassword, { token: params.token, password, again });
  await resetPassword(input, context.get(requestIdContext));
  return redirect("/sign-in?said=password-chosen");
});

export default function ResetPassword({ loaderData, actionData }: Route.ComponentProps) {
  return (
    <Gate title="Choose a new password" lead={"Your other sessions end when you choose it."}>
      <PasswordForm email={loaderData.email} actionData={actionData} />
    </Gate>
  );
}

export function ErrorBoundary({ error }: Route.ErrorBoundaryProps) {
  return (
    <SpentLink error={error} to="/forgot-password" label="Ask for another link">
      If you chose a new password by it already, sign in with that one.
    </SpentLink>
  );
}
