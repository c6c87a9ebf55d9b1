import { Form, Link, redirect } from "react-router";
import { abandonIntake } from "#app/catalogue/intake/abandon-intake.server.ts";
import { applyIntake } from "#app/catalogue/intake/apply-intake.server.ts";
import { readIntake } from "#app/catalogue/intake/read-intakes.server.ts";
import { saveMapping } from "#app/catalogue/intake/save-mapping.server.ts";
import { Invalid } from "#app/errors.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { DefinitionList } from "#app/ui/DefinitionList.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/intake";
import { DryRun } from "./DryRun.tsx";
import { MappingForm } from "./MappingForm.tsx";
import { INTAKE_STATE } from "./words.ts";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.intake.fileName ?? "Intake"} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const query = new URL(request.url).searchParams;
  const from = (name: string) => Math.max(0, Math.trunc(Number(query.get(name))) || 0);
  const page = await readIntake(requireActor(context), params.intake, from("problems"), from("warnings"));
  return { ...page, said: query.get("said") };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const intakeId = params.intake;
  const version = Number(form.get("version"));
  switch (form.get("intent")) {
    case "map":
      await saveMapping(actor, intakeId, version, form);
      return redirect(`/intake/${intakeId}#dry-run`);
    case "apply":
      await applyIntake(actor, { intakeId, version, goodRowsOnly: form.get("goodRowsOnly") !== null });
      return redirect(`/intake/${intakeId}?said=applied`);
    case "abandon":
      await abandonIntake(actor, { intakeId, version });
      return redirect("/intake");
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

const SAID: Record<string, string> = {
  already: "This file was sent before: here is what became of it. Nothing was changed.",
  applied: "The table is in the catalogue. Its records wait for a scientist to vet them.",
};

export default function Intake({ loaderData, actionData }: Route.ComponentProps) {
  const { intake, said, dryRun } = loaderData;
  const { word, tone } = INTAKE_STATE[intake.state];
  const form = formState(actionData);
  return (
    <>
      <PageHead
        title={intake.fileName}
        crumbs={[{ label: "Intake", to: "/intake" }]}
        subtitle={`${plainNumber(intake.rowCount, "en")} rows, ${intake.format === "csv" ? "CSV" : "VOTable"}`}
        state={
          <StateMark tone={tone} large>
            {word}
          </StateMark>
        }
      />
      {said && SAID[said] && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      <FormErrors errors={form.errors} />
      {intake.state === "uploaded" ? (
        <>
          <MappingForm {...loaderData} actionData={actionData} />
          {dryRun ? <DryRun intake={intake} dryRun={dryRun} /> : null}
          <Form method="post" className="mt-12 border-t border-rule pt-6">
            <input type="hidden" name="version" value={intake.version} />
            <SubmitButton intent="abandon" look="danger" pending="Giving up…">
              Give this table up
            </SubmitButton>
          </Form>
        </>
      ) : (
        <Became intake={intake} />
      )}
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];

function Became({ intake }: Pick<Data, "intake">) {
  if (intake.state === "abandoned") return <p>Nothing of it was taken in.</p>;
  const count = (value: number) => plainNumber(value, "en");
  return (
    <>
      <DefinitionList
        ledger
        className="max-w-words"
        items={[
          { term: "New records", value: count(intake.createdCount) },
          { term: "Records that got new measurements", value: count(intake.updatedCount) },
          { term: "Rows of which everything was kept already", value: count(intake.sameCount) },
          { term: "Bad rows that were left out", value: count(intake.badCount) },
        ]}
      />
      <div className="mt-6 flex flex-wrap gap-4">
        <LinkButton to="/stars?state=draft">Records to vet</LinkButton>
        <Link to={`/audit?type=intake&object=${intake.id}`} className="link">
          What happened to this table
        </Link>
      </div>
    </>
  );
}
