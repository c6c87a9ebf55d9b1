import { Form, Link } from "react-router";
import { answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { RequestReset } from "#app/people/input.ts";
import { requestReset } from "#app/people/request-reset.server.ts";
import { visitorOf } from "#app/people/visitor.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/forgot-password";
import { Gate } from "./Gate.tsx";

export const meta: Route.MetaFunction = () => [{ title: "A new password · Alidade" }];

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  await requestReset(parseInput(RequestReset, await readForm(request)), visitorOf(request, context));
  return { problem: undefined, sent: true };
});

export default function ForgotPassword({ actionData }: Route.ComponentProps) {
  const form = formState(actionData);
  return (
    <Gate title="A new password" lead="We send a link by which you choose a new one. It works once, for an hour.">
      {actionData && "sent" in actionData ? (
        <Notice tone="success" title="Look into your mail">
          If there is an account with this address, a link is on its way to it.
        </Notice>
      ) : (
        <Form method="post" noValidate className="grid gap-5">
          <FormErrors errors={form.errors} />
          <Field
            label="Mail address"
            name="email"
            type="email"
            autoComplete="username"
            defaultValue={form.value("email")}
            error={form.error("email")}
            required
          />
          <SubmitButton pending="Sending…" className="justify-self-start">
            Send the link
          </SubmitButton>
        </Form>
      )}
      <p className="mt-6">
        <Link to="/sign-in" className="link">
          Back to signing in
        </Link>
      </p>
    </Gate>
  );
}
