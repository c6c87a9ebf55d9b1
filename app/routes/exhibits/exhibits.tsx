import { Link } from "react-router";
import { readExhibits } from "#app/exhibits/read-exhibits.server.ts";
import { answered } from "#app/http.server.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Table } from "#app/ui/Table.tsx";
import type { Route } from "./+types/exhibits";
import { EXHIBIT_STATE } from "./words.ts";

export const meta: Route.MetaFunction = () => [{ title: "Exhibits · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return { exhibits: await readExhibits(actor), mayWrite: mayDo(actor.roles, "exhibit.write") };
});

export default function Exhibits({ loaderData: { exhibits, mayWrite } }: Route.ComponentProps) {
  const create = mayWrite ? (
    <LinkButton look="primary" to="/exhibits/new">
      New exhibit
    </LinkButton>
  ) : null;
  return (
    <>
      <PageHead title="Exhibits" subtitle="ordered sets of scenes" actions={create} />
      <Table
        caption="Exhibits"
        captionHidden
        rows={exhibits}
        rowKey={(row) => row.id}
        empty={<EmptyState title="No exhibit yet">Build one from vetted stars, scene by scene.</EmptyState>}
        columns={[
          {
            id: "title",
            head: "Exhibit",
            rowHead: true,
            cell: (row) => (
              <>
                <Link to={`/exhibits/${row.id}`} className="link">
                  {row.titleEn}
                </Link>
                <div className="text-sm font-normal text-ink-soft" lang={row.titleFr ? "fr" : undefined}>
                  {row.titleFr ?? "English only"}
                </div>
              </>
            ),
          },
          { id: "scenes", head: "Scenes", numeric: true, cell: (row) => row.scenes },
          {
            id: "edition",
            head: "Newest edition",
            numeric: true,
            cell: (row) =>
              row.edition ? (
                <Link to={`/editions/${row.id}`} className="link">
                  {row.edition}
                </Link>
              ) : (
                <span className="text-ink-soft">none</span>
              ),
          },
          {
            id: "state",
            head: "State",
            cell: (row) => <StateMark tone={EXHIBIT_STATE[row.state].tone}>{EXHIBIT_STATE[row.state].word}</StateMark>,
          },
        ]}
      />
    </>
  );
}
