import { Form, Link, redirect } from "react-router";
import { Invalid } from "#app/errors.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { changeRoles } from "#app/people/change-roles.server.ts";
import { deactivatePerson, reactivatePerson } from "#app/people/deactivate-person.server.ts";
import { ChangeRoles, PersonAndVersion } from "#app/people/input.ts";
import { inviteAgain } from "#app/people/invite-person.server.ts";
import { readPerson } from "#app/people/read-people.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/person";
import { PERSON_STATE } from "./person-state.ts";
import { RoleBoxes } from "./RoleBoxes.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.person.name ?? "Person"} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => ({
  person: await readPerson(requireActor(context), params.person),
  said: new URL(request.url).searchParams.get("said"),
}));

const VERBS = {
  "invite-again": { act: inviteAgain, said: "invited" },
  deactivate: { act: deactivatePerson, said: "closed" },
  reactivate: { act: reactivatePerson, said: "opened" },
} as const;

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const intent = String(form.get("intent"));
  if (intent === "roles") {
    await changeRoles(actor, parseInput(ChangeRoles, form));
    return redirect(`/people/${params.person}?said=roles`);
  }
  if (!(intent in VERBS)) throw new Invalid({ "": ["This page cannot do that."] });
  const verb = VERBS[intent as keyof typeof VERBS];
  await verb.act(actor, parseInput(PersonAndVersion, form));
  return redirect(`/people/${params.person}?said=${verb.said}`);
});

const SAID: Record<string, string> = {
  invited: "The invitation is on its way.",
  roles: "The roles are kept; they count from the next page this person opens.",
  closed: "The account is closed and its sessions have ended.",
  opened: "The account is open again.",
};

export default function Person({ loaderData, actionData }: Route.ComponentProps) {
  const { person, said } = loaderData;
  const { word, tone } = PERSON_STATE[person.state];
  const form = formState(actionData);
  const roles = formState(actionData, {}, "roles");
  const hidden = (
    <>
      <input type="hidden" name="personId" value={person.id} />
      <input type="hidden" name="version" value={person.version} />
    </>
  );
  return (
    <>
      <PageHead
        title={person.name}
        crumbs={[{ label: "People", to: "/people" }]}
        subtitle={person.email}
        state={
          <StateMark tone={tone} large>
            {word}
          </StateMark>
        }
      />
      {said && SAID[said] && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      <FormErrors errors={form.errors} />
      <div className="grid max-w-words gap-10">
        <Form method="post" className="grid gap-5">
          {hidden}
          <RoleBoxes held={roles.chosen("roles", person.roles)} error={form.error("roles")} />
          <SubmitButton intent="roles" className="justify-self-start">
            Keep these roles
          </SubmitButton>
        </Form>
        <Form method="post" className="flex flex-wrap gap-3 border-t border-rule pt-6">
          {hidden}
          {person.state === "invited" ? (
            <SubmitButton intent="invite-again" look="quiet" pending="Sending…">
              Send the invitation again
            </SubmitButton>
          ) : null}
          {person.state === "deactivated" ? (
            <SubmitButton intent="reactivate" look="quiet" pending="Opening…">
              Open the account again
            </SubmitButton>
          ) : (
            <SubmitButton intent="deactivate" look="danger" pending="Closing…">
              Close the account
            </SubmitButton>
          )}
        </Form>
        <p>
          <Link to={`/audit?person=${person.id}`} className="link">
            What {person.name} did
          </Link>
        </p>
      </div>
    </>
  );
}
