import { Link } from "react-router";
import { readEditions } from "#app/editions/read-editions.server.ts";
import { answered } from "#app/http.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Table } from "#app/ui/Table.tsx";
import { Time } from "#app/ui/Time.tsx";
import type { Route } from "./+types/editions";

export const meta: Route.MetaFunction = () => [{ title: "Editions · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => ({
  editions: await readEditions(requireActor(context)),
}));

export default function Editions({ loaderData: { editions } }: Route.ComponentProps) {
  return (
    <>
      <PageHead title="Editions" subtitle="what was published, for good" />
      <Table
        caption="Editions"
        captionHidden
        rows={editions}
        rowKey={(row) => row.id}
        empty={<EmptyState title="Nothing is published yet">An approved exhibit becomes an edition.</EmptyState>}
        columns={[
          {
            id: "exhibit",
            head: "Exhibit",
            rowHead: true,
            cell: (row) => (
              <Link to={`/editions/${row.exhibitId}`} className="link">
                {row.exhibit}
              </Link>
            ),
          },
          { id: "number", head: "Edition", numeric: true, cell: (row) => row.number },
          { id: "at", head: "Published", cell: (row) => <Time at={row.publishedAt} form="moment" /> },
          { id: "by", head: "By", cell: (row) => row.publishedBy },
          {
            id: "digest",
            head: "Digest",
            cell: (row) => <code className="num text-sm">{row.digest.slice(0, 16)}</code>,
          },
        ]}
      />
    </>
  );
}
