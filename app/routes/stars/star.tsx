import { Form, Link, redirect } from "react-router";
import { addMeasurement } from "#app/catalogue/add-measurement.server.ts";
import { adoptParallax } from "#app/catalogue/adopt-parallax.server.ts";
import { answerDistance } from "#app/catalogue/answer-distance.ts";
import { distanceCurve } from "#app/catalogue/distance-curve.ts";
import { priorOf } from "#app/catalogue/distance-of.ts";
import { confirmMeasurement, rejectMeasurement } from "#app/catalogue/judge-measurement.server.ts";
import { AddMeasurement, ConfirmMeasurement, RejectMeasurement } from "#app/catalogue/measurement-input.ts";
import { readRecord } from "#app/catalogue/read-record.server.ts";
import { AdoptParallax, UnvetRecord, VetRecord } from "#app/catalogue/record-input.ts";
import { unvetRecord, vetRecord } from "#app/catalogue/vet-record.server.ts";
import { Invalid } from "#app/errors.ts";
import { readUses } from "#app/exhibits/read-uses.server.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Table } from "#app/ui/Table.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { Time } from "#app/ui/Time.tsx";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/star";
import { AdoptForm } from "./AdoptForm.tsx";
import { DistancePanel } from "./DistancePanel.tsx";
import { Ledger } from "./Ledger.tsx";
import { MeasurementForm } from "./MeasurementForm.tsx";
import { PositionList } from "./PositionList.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.record.name ?? "Star"} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  const [page, uses] = await Promise.all([readRecord(actor, params.record), readUses(actor, params.record)]);
  const prior = priorOf(page.record.prior, page.record.priorScalePc);
  const { answer, ...rest } = page;
  return {
    ...rest,
    uses,
    distance: answer
      ? {
          reply: answerDistance({
            parallaxMas: answer.parallaxMas,
            errorMas: answer.errorMas,
            prior,
            lengthIsDefault: false,
          }),
          curve: distanceCurve(answer, prior),
        }
      : null,
    personId: actor.personId,
    mayWrite: mayDo(actor.roles, "record.write"),
    mayVet: mayDo(actor.roles, "record.vet"),
    said: new URL(request.url).searchParams.get("said"),
  };
});

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const done = (said: string) => redirect(`/stars/${params.record}?said=${said}`);
  switch (form.get("intent")) {
    case "measure":
      await addMeasurement(actor, parseInput(AddMeasurement, form));
      return done("measured");
    case "adopt":
      await adoptParallax(actor, parseInput(AdoptParallax, form));
      return done("adopted");
    case "confirm":
      await confirmMeasurement(actor, parseInput(ConfirmMeasurement, form));
      return done("confirmed");
    case "reject":
      await rejectMeasurement(actor, parseInput(RejectMeasurement, form));
      return done("rejected");
    case "vet":
      await vetRecord(actor, parseInput(VetRecord, form));
      return done("vetted");
    case "unvet":
      await unvetRecord(actor, parseInput(UnvetRecord, form));
      return done("unvetted");
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

const SAID: Record<string, string> = {
  kept: "The record is kept.",
  measured: "The measurement is proposed. Nothing is adopted by that.",
  adopted: "The parallax is adopted.",
  confirmed: "The value is no longer from memory.",
  rejected: "The measurement is set aside.",
  vetted: "The record is vetted.",
  unvetted: "The record is a draft again.",
};

export default function Star({ loaderData, actionData }: Route.ComponentProps) {
  const { record, said, mayWrite, ledger, adopted, sources, uses } = loaderData;
  const choices = ledger.filter((one) => one.quantity === "parallax" && one.state !== "rejected" && one.error !== null);
  const refusedIntent = actionData?.problem.values.intent;
  const elsewhere = formState(actionData).errors && !["measure", "adopt"].includes(refusedIntent ?? "");
  return (
    <>
      <PageHead
        title={record.name}
        crumbs={[{ label: "Stars", to: "/stars" }]}
        subtitle={<Designations {...loaderData} />}
        state={<VettedMark record={record} />}
        actions={
          mayWrite ? (
            <LinkButton to={`/stars/${record.id}/edit`} look="quiet">
              Edit
            </LinkButton>
          ) : null
        }
      />
      {said && SAID[said] && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      {elsewhere ? <FormErrors errors={actionData?.problem.errors} idFor={() => "main"} /> : null}
      <div className="grid gap-14 xl:grid-cols-[1fr_2fr]">
        <div className="grid content-start gap-10">
          <DistancePanel distance={loaderData.distance} name={record.name} />
          <PositionList record={record} source={loaderData.positionSource} />
        </div>
        <div className="grid content-start gap-10">
          <Ledger
            ledger={ledger}
            adoptedId={adopted?.id ?? null}
            mayVet={loaderData.mayVet}
            personId={loaderData.personId}
          />
          <Uses uses={uses} />
          <Vetting {...loaderData} />
          {mayWrite ? (
            <div>
              <Disclosure summary="Add a measurement" open={refusedIntent === "measure" || ledger.length === 0}>
                <MeasurementForm recordId={record.id} actionData={actionData} sources={sources} />
              </Disclosure>
              {choices.length > 0 ? (
                <Disclosure
                  summary={adopted ? "Adopt another value" : "Adopt a value"}
                  open={refusedIntent === "adopt" || !adopted}
                >
                  <AdoptForm
                    key={`${record.version} ${choices.length}`}
                    record={record}
                    choices={choices}
                    actionData={actionData}
                  />
                </Disclosure>
              ) : null}
            </div>
          ) : null}
          <p>
            <Link to={`/audit?type=record&object=${record.id}`} className="link">
              What happened to this record
            </Link>
          </p>
        </div>
      </div>
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];

function Designations({ names, identifiers, record }: Pick<Data, "names" | "identifiers" | "record">) {
  const words = [...names.map((one) => one.name), ...identifiers.map((one) => `${one.catalogue} ${one.value}`)];
  return <>{[...words, `revision ${record.version}`].join(" · ")}</>;
}

function VettedMark({ record }: Pick<Data, "record">) {
  if (record.state !== "vetted" || !record.vettedAt) {
    return (
      <StateMark tone="person" large>
        draft
      </StateMark>
    );
  }
  return (
    <StateMark tone="vetted" large>
      vetted <Time at={record.vettedAt} /> by {record.vetterName}
    </StateMark>
  );
}

function Uses({ uses }: Pick<Data, "uses">) {
  if (uses.length === 0) return null;
  return (
    <Table
      caption="Where this star is used"
      rows={uses}
      rowKey={(row) => `${row.sceneId} ${row.key ?? ""}`}
      columns={[
        {
          id: "where",
          head: "Exhibit, scene",
          rowHead: true,
          cell: (row) => (
            <Link to={`/exhibits/${row.exhibitId}/scenes/${row.sceneId}`} className="link">
              {row.exhibit} / {row.scene}
            </Link>
          ),
        },
        { id: "as", head: "As", cell: (row) => (row.key ? `figure {${row.key}} in the words` : "one of the cast") },
        { id: "state", head: "Exhibit is", cell: (row) => <StateMark tone="none">{row.state}</StateMark> },
      ]}
    />
  );
}

function Vetting({ record, missing, isOwnWork, mayVet }: Data) {
  const hidden = (
    <>
      <input type="hidden" name="recordId" value={record.id} />
      <input type="hidden" name="version" value={record.version} />
    </>
  );
  if (record.state === "vetted") {
    if (!mayVet) return null;
    return (
      <Disclosure summary="Take the vetting back">
        <Form method="post" className="grid max-w-words gap-4">
          {hidden}
          <TextArea label="Why" name="reason" rows={2} required />
          <SubmitButton intent="unvet" look="danger" className="justify-self-start">
            Make it a draft again
          </SubmitButton>
        </Form>
      </Disclosure>
    );
  }
  return (
    <section>
      <h2 className="mb-2">Before it can be vetted</h2>
      {missing.length > 0 ? (
        <ul className="list-disc pl-5">
          {missing.map((one) => (
            <li key={one.field}>{one.message}</li>
          ))}
        </ul>
      ) : (
        <p>Nothing is missing. It waits for a scientist who entered none of it.</p>
      )}
      {mayVet && missing.length === 0 ? (
        isOwnWork ? (
          <p className="mt-2 text-ink-soft">You have a hand in it, so somebody else has to vet it.</p>
        ) : (
          <Form method="post" className="mt-4">
            {hidden}
            <SubmitButton intent="vet">Vet this record</SubmitButton>
          </Form>
        )
      ) : null}
    </section>
  );
}
