import { Link, redirect } from "react-router";
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
import { Table } from "#app/ui/Table.tsx";
import { Time } from "#app/ui/Time.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import type { Route } from "./+types/star";
import { AdoptForm } from "./AdoptForm.tsx";
import { DistancePanel } from "./DistancePanel.tsx";
import { Ledger } from "./Ledger.tsx";
import { MeasurementForm } from "./MeasurementForm.tsx";
import { PositionList } from "./PositionList.tsx";
import { SAID, saidOfMeasurement } from "./said.ts";
import { VettingPanel } from "./VettingPanel.tsx";

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
    seenInYear: new Date().getUTCFullYear(),
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
    case "measure": {
      const measured = parseInput(AddMeasurement, form);
      await addMeasurement(actor, measured);
      return done(saidOfMeasurement(measured));
    }
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

export const shouldRevalidate = readAgainAfterConflict;

export default function Star({ loaderData, actionData }: Route.ComponentProps) {
  const { record, said, mayWrite, ledger, adopted, sources, uses } = loaderData;
  const choices = ledger.filter((one) => one.quantity === "parallax" && one.state !== "rejected" && one.error !== null);
  const refusedIntent = actionData?.problem.values.intent;
  const elsewhere = actionData && !["measure", "adopt"].includes(refusedIntent ?? "");
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
      {said && Object.hasOwn(SAID, said) && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      {elsewhere ? <FormErrors errors={actionData?.problem.errors} idFor={() => "main"} /> : null}
      <div className="grid gap-14 xl:grid-cols-[1fr_2fr]">
        <div className="grid content-start gap-10">
          <DistancePanel distance={loaderData.distance} name={record.name} seenInYear={loaderData.seenInYear} />
          <PositionList record={record} source={loaderData.positionSource} />
        </div>
        <div className="grid content-start gap-10">
          <Ledger ledger={ledger} adoptedId={adopted?.id ?? null} actionData={actionData} />
          <Uses uses={uses} />
          <VettingPanel {...loaderData} actionData={actionData} />
          {mayWrite ? (
            <div>
              <Disclosure summary="Add a measurement" open={refusedIntent === "measure" || ledger.length === 0}>
                <MeasurementForm key={ledger.length} recordId={record.id} actionData={actionData} sources={sources} />
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
      <span>
        vetted <Time at={record.vettedAt} /> by {record.vetterName}
      </span>
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
