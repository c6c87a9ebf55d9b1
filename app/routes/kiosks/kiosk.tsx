import { Form, redirect } from "react-router";
import { Invalid } from "#app/errors.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { assignKiosk } from "#app/kiosks/assign-kiosk.server.ts";
import { editKiosk } from "#app/kiosks/edit-kiosk.server.ts";
import { AssignKiosk, EditKiosk } from "#app/kiosks/kiosk-input.ts";
import { readKiosk } from "#app/kiosks/read-kiosks.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/kiosk";
import { KioskFields } from "./KioskFields.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.kiosk.name ?? "Kiosk"} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return {
    ...(await readKiosk(actor, params.kiosk)),
    mayManage: mayDo(actor.roles, "kiosk.manage"),
    mayAssign: mayDo(actor.roles, "kiosk.assign"),
    said: new URL(request.url).searchParams.get("said"),
  };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const back = redirect(`/kiosks/${params.kiosk}?said=kept`);
  switch (form.get("intent")) {
    case "edit":
      await editKiosk(actor, parseInput(EditKiosk, form));
      return back;
    case "assign":
      await assignKiosk(actor, parseInput(AssignKiosk, form));
      return back;
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

export default function Kiosk({ loaderData, actionData }: Route.ComponentProps) {
  const { kiosk, published, mayManage, mayAssign, said } = loaderData;
  const edit = formState(
    actionData,
    { name: kiosk.name, station: kiosk.station, language: kiosk.language, idleSeconds: kiosk.idleSeconds },
    "edit",
  );
  const assign = formState(actionData, { exhibitId: kiosk.exhibitId }, "assign");
  const shown = published.find((one) => one.exhibitId === kiosk.exhibitId);
  const hidden = (
    <>
      <input type="hidden" name="kioskId" value={kiosk.id} />
      <input type="hidden" name="version" value={kiosk.version} />
    </>
  );
  return (
    <>
      <PageHead
        title={kiosk.name}
        crumbs={[{ label: "Kiosks", to: "/kiosks" }]}
        subtitle={kiosk.station}
        actions={
          <a href={`/k/${kiosk.slug}`} className="link">
            Its page, /k/{kiosk.slug}
          </a>
        }
      />
      {said && !actionData ? <Notice tone="success">Kept.</Notice> : null}
      <FormErrors errors={actionData?.problem.errors} />
      <div className="grid gap-14 lg:grid-cols-2">
        <section>
          <h2 className="mb-3">What it shows</h2>
          {mayAssign ? (
            <Form method="post" className="grid max-w-words gap-4">
              {hidden}
              <Select
                label="Exhibit"
                name="exhibitId"
                placeholder="Nothing: it rests"
                defaultValue={assign.value("exhibitId")}
                error={assign.error("exhibitId")}
                hint="Only what is published can be shown. The newest edition is taken when nobody touches the kiosk."
                options={published.map((one) => ({
                  value: one.exhibitId,
                  label: `${one.title}, edition ${one.edition}`,
                }))}
              />
              <SubmitButton intent="assign" className="justify-self-start">
                Show this
              </SubmitButton>
            </Form>
          ) : (
            <p>
              {shown ? `${shown.title}, edition ${shown.edition}` : "Nothing: it rests."}
              <span className="block text-ink-soft">A publisher says what it shows.</span>
            </p>
          )}
        </section>
        {mayManage ? (
          <section>
            <h2 className="mb-3">The kiosk</h2>
            <Form method="post" noValidate className="grid max-w-words gap-5">
              {hidden}
              <KioskFields form={edit} />
              <SubmitButton intent="edit" look="quiet" className="justify-self-start">
                Keep it
              </SubmitButton>
            </Form>
          </section>
        ) : null}
      </div>
    </>
  );
}
