import { Form, Link, redirect } from "react-router";
import { ROLES } from "#app/audit/actor.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { InvitePerson } from "#app/people/input.ts";
import { invitePerson } from "#app/people/invite-person.server.ts";
import { readPeople } from "#app/people/read-people.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Table } from "#app/ui/Table.tsx";
import { formState } from "../form-state.ts";
import { ROLE_WORDS } from "../office-places.ts";
import type { Route } from "./+types/people";
import { PERSON_STATE } from "./person-state.ts";
import { RoleBoxes } from "./RoleBoxes.tsx";

export const meta: Route.MetaFunction = () => [{ title: "People · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => ({
  people: await readPeople(requireActor(context)),
}));

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const form = await readForm(request);
  const personId = await invitePerson(requireActor(context), parseInput(InvitePerson, form));
  return redirect(`/people/${personId}?said=invited`);
});

export default function People({ loaderData, actionData }: Route.ComponentProps) {
  const form = formState(actionData);
  return (
    <>
      <PageHead title="People" subtitle="Nobody signs their own work, whatever roles they hold." />
      <div className="grid items-start gap-14 lg:grid-cols-[3fr_2fr]">
        <Table
          caption="Everybody with an account"
          captionHidden
          rows={loaderData.people}
          rowKey={(row) => row.id}
          columns={[
            {
              id: "name",
              head: "Name",
              rowHead: true,
              cell: (row) => (
                <Link to={`/people/${row.id}`} className="link">
                  {row.name}
                </Link>
              ),
            },
            { id: "email", head: "Mail address", cell: (row) => row.email },
            {
              id: "roles",
              head: "Roles",
              cell: (row) =>
                ROLES.filter((role) => row.roles.includes(role))
                  .map((role) => ROLE_WORDS[role])
                  .join(", "),
            },
            {
              id: "state",
              head: "State",
              cell: (row) => <StateMark tone={PERSON_STATE[row.state].tone}>{PERSON_STATE[row.state].word}</StateMark>,
            },
          ]}
        />
        <section>
          <h2 className="mb-4">Invite somebody</h2>
          <Form method="post" noValidate className="grid gap-5">
            <FormErrors errors={form.errors} />
            <Field label="Name" name="name" defaultValue={form.value("name")} error={form.error("name")} required />
            <Field
              label="Mail address"
              name="email"
              type="email"
              defaultValue={form.value("email")}
              error={form.error("email")}
              hint="The invitation goes there; the link works once, for seven days."
              required
            />
            <RoleBoxes error={form.error("roles")} held={form.chosen("roles", [])} />
            <SubmitButton intent="invite" pending="Inviting…" className="justify-self-start">
              Send the invitation
            </SubmitButton>
          </Form>
        </section>
      </div>
    </>
  );
}
