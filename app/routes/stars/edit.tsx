import { redirect } from "react-router";
import { editRecord } from "#app/catalogue/edit-record.server.ts";
import { readRecord } from "#app/catalogue/read-record.server.ts";
import { EditRecord } from "#app/catalogue/record-input.ts";
import type { RecordKind } from "#app/database/enums.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { TheirsAndYours } from "../TheirsAndYours.tsx";
import type { Route } from "./+types/edit";
import { RecordForm } from "./RecordForm.tsx";
import { KIND_WORDS } from "./words.ts";

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

export const shouldRevalidate = readAgainAfterConflict;

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

const isKind = (text: string): text is RecordKind => Object.hasOwn(KIND_WORDS, text);

export default function EditRecordPage({ loaderData, actionData }: Route.ComponentProps) {
  const { id, version, state, saved, sources } = loaderData;
  const say = (field: string, value: string) => {
    if (field === "positionSourceId") return sources.find((one) => one.id === value)?.citation ?? value;
    return field === "kind" && isKind(value) ? KIND_WORDS[value] : value;
  };
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
      {conflict ? <TheirsAndYours labels={LABELS} theirs={saved} yours={conflict} say={say} /> : null}
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
