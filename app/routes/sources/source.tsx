import { Link, redirect } from "react-router";
import { editSource } from "#app/catalogue/edit-source.server.ts";
import { readSource } from "#app/catalogue/read-sources.server.ts";
import { EditSource } from "#app/catalogue/source-input.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Table } from "#app/ui/Table.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { TheirsAndYours } from "../TheirsAndYours.tsx";
import type { Route } from "./+types/source";
import { SourceForm } from "./SourceForm.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.source.citation ?? "Source"} · Alidade` },
];

export const loader = answered(async ({ context, params }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return { ...(await readSource(actor, params.source)), mayWrite: mayDo(actor.roles, "source.write") };
});

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  await editSource(requireActor(context), parseInput(EditSource, await readForm(request)));
  return redirect(`/sources/${params.source}`);
});

export const shouldRevalidate = readAgainAfterConflict;

const LABELS: Record<string, string> = {
  title: "Title",
  authors: "Authors",
  year: "Year",
  designation: "Catalogue designation",
  bibcode: "Bibcode",
  doi: "DOI",
  note: "Note",
};

export default function Source({ loaderData, actionData }: Route.ComponentProps) {
  const { source, users, mayWrite } = loaderData;
  const { title, authors, year, designation, bibcode, doi, note } = source;
  const saved = { title, authors, year, designation, bibcode, doi, note };
  const conflict = actionData?.problem.kind === "conflict" ? actionData.problem.values : null;
  return (
    <>
      <PageHead title={source.citation} crumbs={[{ label: "Sources", to: "/sources" }]} subtitle={bibcode ?? doi} />
      <p className="max-w-words">{source.full}</p>
      {note ? <p className="mt-2 max-w-words text-ink-soft">{note}</p> : null}
      <p className="mt-2 break-all text-sm text-ink-soft">
        {[bibcode, doi ? `doi:${doi}` : null].filter(Boolean).join(" · ")}
      </p>
      <div className="mt-10 grid gap-14 lg:grid-cols-2">
        <Table
          caption="Records that rest on it"
          rows={users}
          rowKey={(row) => row.id}
          empty={<p className="text-ink-soft">No record cites it yet.</p>}
          columns={[
            {
              id: "name",
              head: "Record",
              rowHead: true,
              cell: (row) => (
                <Link to={`/stars/${row.id}`} className="link">
                  {row.name}
                </Link>
              ),
            },
            {
              id: "state",
              head: "State",
              cell: (row) => <StateMark tone={row.state === "vetted" ? "vetted" : "none"}>{row.state}</StateMark>,
            },
          ]}
        />
        {mayWrite ? (
          <Disclosure summary="Correct this source" open={Boolean(actionData)}>
            {conflict ? <TheirsAndYours labels={LABELS} theirs={saved} yours={conflict} /> : null}
            <SourceForm
              actionData={actionData}
              saved={saved}
              hidden={{ sourceId: source.id, version: source.version }}
              cancelTo={`/sources/${source.id}`}
            />
          </Disclosure>
        ) : null}
      </div>
    </>
  );
}
