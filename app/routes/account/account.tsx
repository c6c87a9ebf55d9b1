import { Form, redirect } from "react-router";
import { Invalid } from "#app/errors.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { changePassword } from "#app/people/change-password.server.ts";
import { ChangePassword, RevokeSession } from "#app/people/input.ts";
import { readAccount } from "#app/people/read-people.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { revokeSession } from "#app/people/revoke-session.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Table } from "#app/ui/Table.tsx";
import { Time } from "#app/ui/Time.tsx";
import { formState } from "../form-state.ts";
import { ROLE_WORDS } from "../office-places.ts";
import type { Route } from "./+types/account";
import { browserWords } from "./browser-words.ts";

export const meta: Route.MetaFunction = () => [{ title: "Your account · Alidade" }];

export const loader = answered(async ({ context, request }: Route.LoaderArgs) => ({
  account: await readAccount(requireActor(context)),
  said: new URL(request.url).searchParams.get("said"),
}));

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  switch (form.get("intent")) {
    case "password":
      await changePassword(actor, parseInput(ChangePassword, form));
      return redirect("/account?said=password");
    case "revoke":
      await revokeSession(actor, parseInput(RevokeSession, form));
      return redirect("/account?said=session");
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

const SAID: Record<string, string> = {
  password: "Your password is changed. Your other sessions have ended.",
  session: "That session has ended.",
};

export default function Account({ loaderData, actionData }: Route.ComponentProps) {
  const { account, said } = loaderData;
  const form = formState(actionData, {}, "password");
  return (
    <>
      <PageHead title="Your account" subtitle={account.email} />
      {said && SAID[said] && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      <div className="grid items-start gap-14 lg:grid-cols-[2fr_3fr]">
        <section>
          <h2 className="mb-1">{account.name}</h2>
          <p className="mb-8 text-ink-soft">{account.roles.map((role) => ROLE_WORDS[role]).join(", ")}</p>
          <h2 className="mb-4">Change your password</h2>
          <Form method="post" noValidate className="grid max-w-words gap-5">
            <FormErrors errors={form.errors} />
            <Field
              label="Present password"
              name="current"
              type="password"
              autoComplete="current-password"
              error={form.error("current")}
              required
            />
            <Field
              label="New password"
              name="password"
              type="password"
              autoComplete="new-password"
              hint="At least 12 characters."
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
            <SubmitButton intent="password" className="justify-self-start">
              Change the password
            </SubmitButton>
          </Form>
        </section>
        <Table
          caption="Where you are signed in"
          rows={account.sessions}
          rowKey={(row) => row.id}
          columns={[
            {
              id: "agent",
              head: "Browser",
              rowHead: true,
              cell: (row) => (
                <>
                  {row.isThisOne ? "This browser" : "Another browser"}
                  <div className="text-sm font-normal text-ink-soft">
                    {browserWords(row.userAgent)}
                    {row.address ? `, from ${row.address}` : ""}
                  </div>
                </>
              ),
            },
            { id: "seen", head: "Last used", cell: (row) => <Time at={row.lastSeenAt} form="moment" /> },
            { id: "ends", head: "Ends at the latest", cell: (row) => <Time at={row.expiresAt} /> },
            {
              id: "end",
              head: "End it",
              headHidden: true,
              className: "whitespace-nowrap",
              cell: (row) =>
                row.isThisOne ? null : (
                  <Form method="post">
                    <input type="hidden" name="sessionId" value={row.id} />
                    <SubmitButton intent="revoke" look="quiet" pending="Ending…">
                      End it
                    </SubmitButton>
                  </Form>
                ),
            },
          ]}
        />
      </div>
    </>
  );
}
