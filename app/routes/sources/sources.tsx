import { Link } from "react-router";
import { readSources } from "#app/catalogue/read-sources.server.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import { answered } from "#app/http.server.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Table } from "#app/ui/Table.tsx";
import type { Route } from "./+types/sources";

export const meta: Route.MetaFunction = () => [{ title: "Sources · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return { sources: await readSources(actor), mayWrite: mayDo(actor.roles, "source.write") };
});

export default function Sources({ loaderData: { sources, mayWrite } }: Route.ComponentProps) {
  return (
    <>
      <PageHead
        title="Sources"
        subtitle="who measured it, and where it is printed"
        actions={
          mayWrite ? (
            <LinkButton look="primary" to="/sources/new">
              New source
            </LinkButton>
          ) : null
        }
      />
      <Table
        caption="Sources"
        captionHidden
        rows={sources}
        rowKey={(row) => row.id}
        empty={<EmptyState title="No source yet">Every number that visitors read rests on one.</EmptyState>}
        columns={[
          {
            id: "citation",
            head: "Source",
            rowHead: true,
            cell: (row) => (
              <>
                <Link to={`/sources/${row.id}`} className="link">
                  {row.citation}
                </Link>
                <div className="text-sm font-normal text-ink-soft">{row.title}</div>
              </>
            ),
          },
          {
            id: "code",
            head: "Bibcode or DOI",
            cell: (row) => <span className="break-all">{row.bibcode ?? row.doi}</span>,
          },
          { id: "uses", head: "Measurements", numeric: true, cell: (row) => plainNumber(row.uses, "en") },
        ]}
      />
    </>
  );
}
