import { Form, Link, redirect } from "react-router";
import { actorContext } from "#app/context.server.ts";
import { answeredAction, readForm } from "#app/http.server.ts";
import { authenticateForm } from "#app/people/authenticator.server.ts";
import { setSessionToken } from "#app/people/session-cookie.server.ts";
import { visitorOf } from "#app/people/visitor.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/sign-in";
import { Gate } from "./Gate.tsx";
import { ownPath } from "./own-path.ts";

export const meta: Route.MetaFunction = () => [{ title: "Sign in · Alidade" }];

export function loader({ request, context }: Route.LoaderArgs) {
  const query = new URL(request.url).searchParams;
  const to = ownPath(query.get("to"));
  if (context.get(actorContext)) throw redirect(to);
  return { to, said: query.get("said") };
}

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const copy = request.clone();
  const form = await readForm(request);
  const { token, expiresAt } = await authenticateForm(copy, visitorOf(request, context));
  const to = form.get("to");
  return redirect(ownPath(typeof to === "string" ? to : null), {
    headers: { "Set-Cookie": await setSessionToken(token, expiresAt) },
  });
});

const SAID: Record<string, string> = {
  "signed-out": "You are signed out.",
  "password-chosen": "Your password is kept. Sign in with it now.",
};

export default function SignIn({ loaderData, actionData }: Route.ComponentProps) {
  const form = formState(actionData);
  const said = loaderData.said ? SAID[loaderData.said] : undefined;
  return (
    <Gate title="Sign in">
      {said && !form.errors ? <Notice tone="success">{said}</Notice> : null}
      <Form method="post" noValidate className="grid gap-5">
        <FormErrors errors={form.errors} />
        <input type="hidden" name="to" value={loaderData.to} />
        <Field
          label="Mail address"
          name="email"
          type="email"
          autoComplete="username"
          defaultValue={form.value("email")}
          error={form.error("email")}
          required
        />
        <Field
          label="Password"
          name="password"
          type="password"
          autoComplete="current-password"
          error={form.error("password")}
          required
        />
        <div className="flex flex-wrap items-center gap-5">
          <SubmitButton pending="Signing in…">Sign in</SubmitButton>
          <Link to="/forgot-password" className="link tap inline-flex items-center">
            Forgotten the password?
          </Link>
        </div>
      </Form>
    </Gate>
  );
}
