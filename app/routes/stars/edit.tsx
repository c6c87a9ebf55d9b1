import { redirect } from "react-router";
import { editRecord } from "#app/catalogue/edit-record.server.ts";
import { readRecord } from "#app/catalogue/read-record.server.ts";
import { EditRecord } from "#app/catalogue/record-input.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { DiffRow } from "#app/ui/DiffRow.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import type { Route } from "./+types/edit";
import { RecordForm } from "./RecordForm.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [{ title: `Edit ${loaderData?.saved.name} · Alidade` }];

export const loader = answered(async ({ context, params }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  authorise(actor, "record.write");
  const { record, names, identifiers, sources } = await readRecord(actor, params.record);
  const saved = {
    name: record.name,
    kind: record.kind,
    otherNames: names.map((one) => (one.language ? `${one.language}: ${one.name}` : one.name)).join("\n"),
    identifiers: identifiers.map((one) => `${one.catalogue} ${one.value}`).join("\n"),
    ra: record.raText,
    dec: record.decText,
    positionEpoch: record.positionEpoch,
    positionSourceId: record.positionSourceId,
    positionLocator: record.positionLocator,
    positionNote: record.positionNote,
  };
  return { id: record.id, version: record.version, state: record.state, saved, sources };
});

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  await editRecord(requireActor(context), parseInput(EditRecord, await readForm(request)));
  return redirect(`/stars/${params.record}?said=kept`);
});

const LABELS: Record<string, string> = {
  name: "Name",
  kind: "Kind",
  otherNames: "Other names",
  identifiers: "Identifiers",
  ra: "Right ascension",
  dec: "Declination",
  positionEpoch: "Epoch",
  positionSourceId: "Source of the position",
  positionLocator: "Where in the source",
  positionNote: "Note on the position",
};

export default function EditRecordPage({ loaderData, actionData }: Route.ComponentProps) {
  const { id, version, state, saved, sources } = loaderData;
  const conflict = actionData?.problem.kind === "conflict" ? actionData.problem.values : null;
  return (
    <>
      <PageHead
        title={`Edit ${saved.name}`}
        crumbs={[
          { label: "Stars", to: "/stars" },
          { label: saved.name, to: `/stars/${id}` },
        ]}
      />
      {state === "vetted" ? (
        <Notice tone="warning">
          This record is vetted. A change makes it a draft again, and seals that read it may end.
        </Notice>
      ) : null}
      {conflict ? <Merge saved={saved} typed={conflict} /> : null}
      <RecordForm
        actionData={actionData}
        saved={saved}
        sources={sources}
        hidden={{ recordId: id, version }}
        cancelTo={`/stars/${id}`}
      />
    </>
  );
}

/** Somebody else saved first: what they kept beside what was typed. Saving again keeps the form as it stands below. */
function Merge({ saved, typed }: { saved: Record<string, string | null>; typed: Record<string, string> }) {
  const differing = Object.keys(LABELS).filter(
    (name) => (saved[name] ?? "") !== (typed[name] ?? "").replace(/\r\n/g, "\n"),
  );
  return (
    <Notice tone="warning" title="Somebody else saved this record while you were typing">
      <p className="mb-3">
        Your words are still in the form below. Take over from theirs what you want to keep, then save again.
      </p>
      {differing.map((name) => (
        <DiffRow
          key={name}
          label={LABELS[name] ?? name}
          before={`theirs: ${saved[name] ?? "nothing"}`}
          after={`yours: ${typed[name] ?? ""}`}
        />
      ))}
    </Notice>
  );
}
