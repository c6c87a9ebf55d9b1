import { Form, Link, redirect } from "react-router";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { createKiosk } from "#app/kiosks/create-kiosk.server.ts";
import { CreateKiosk } from "#app/kiosks/kiosk-input.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/new";
import { KioskFields } from "./KioskFields.tsx";

export const meta: Route.MetaFunction = () => [{ title: "New kiosk · Alidade" }];

export const loader = answered(({ context }: Route.LoaderArgs) => {
  authorise(requireActor(context), "kiosk.manage");
  return null;
});

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const input = parseInput(CreateKiosk, await readForm(request));
  return redirect(`/kiosks/${await createKiosk(requireActor(context), input)}`);
});

export default function NewKiosk({ actionData }: Route.ComponentProps) {
  const form = formState(actionData, { language: "en", idleSeconds: 60 });
  return (
    <>
      <PageHead title="New kiosk" crumbs={[{ label: "Kiosks", to: "/kiosks" }]} />
      <Form method="post" noValidate className="grid max-w-words gap-5">
        <FormErrors errors={form.errors} />
        <Field
          label="Address"
          hint="Small letters, digits, hyphens: its page is /k/ and this."
          name="slug"
          defaultValue={form.value("slug")}
          error={form.error("slug")}
          required
        />
        <KioskFields form={form} />
        <div className="flex flex-wrap items-center gap-4">
          <SubmitButton pending="Setting up…">Set it up</SubmitButton>
          <Link to="/kiosks" className="link">
            Leave it
          </Link>
        </div>
      </Form>
    </>
  );
}
