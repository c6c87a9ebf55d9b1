import { Form, Link, redirect } from "react-router";
import { createExhibit } from "#app/exhibits/create-exhibit.server.ts";
import { CreateExhibit } from "#app/exhibits/exhibit-input.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/new";

export const meta: Route.MetaFunction = () => [{ title: "New exhibit · Alidade" }];

export const loader = answered(({ context }: Route.LoaderArgs) => {
  authorise(requireActor(context), "exhibit.write");
  return null;
});

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const input = parseInput(CreateExhibit, await readForm(request));
  return redirect(`/exhibits/${await createExhibit(requireActor(context), input)}`);
});

export default function NewExhibit({ actionData }: Route.ComponentProps) {
  const form = formState(actionData);
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <>
      <PageHead title="New exhibit" crumbs={[{ label: "Exhibits", to: "/exhibits" }]} />
      <Form method="post" noValidate className="grid max-w-words gap-5">
        <FormErrors errors={form.errors} />
        <Field label="Title" required {...field("titleEn")} />
        <Field
          label="Title in French"
          hint="Leave it empty for an exhibit in English only."
          lang="fr"
          {...field("titleFr")}
        />
        <Field
          label="Address"
          hint="Small letters, digits, hyphens, such as nearest-suns. Its feed and its editions go by it; it cannot be changed later."
          required
          {...field("slug")}
        />
        <div className="flex flex-wrap items-center gap-4">
          <SubmitButton pending="Creating…">Create the exhibit</SubmitButton>
          <Link to="/exhibits" className="link">
            Leave it
          </Link>
        </div>
      </Form>
    </>
  );
}
