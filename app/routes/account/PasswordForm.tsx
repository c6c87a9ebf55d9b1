import { Form } from "react-router";
import type { FormProblem } from "#app/http.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";

/** Choosing a password, twice; for invitations and resets. */
export function PasswordForm({ email, actionData }: { email: string; actionData: FormProblem | undefined }) {
  const form = formState(actionData);
  return (
    <Form method="post" noValidate className="grid gap-5">
      <FormErrors errors={form.errors} />
      <Field label="Mail address" name="email" type="email" autoComplete="username" defaultValue={email} readOnly />
      <Field
        label="New password"
        name="password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters. A sentence is easier to remember than a word."
        error={form.error("password")}
        required
      />
      <Field
        label="The same again"
        name="again"
        type="password"
        autoComplete="new-password"
        error={form.error("again")}
        required
      />
      <SubmitButton className="justify-self-start">Keep this password</SubmitButton>
    </Form>
  );
}
