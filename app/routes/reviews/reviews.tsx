import { Link } from "react-router";
import { readExhibits } from "#app/exhibits/read-exhibits.server.ts";
import { answered } from "#app/http.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Table } from "#app/ui/Table.tsx";
import { EXHIBIT_STATE } from "../exhibits/words.ts";
import type { Route } from "./+types/reviews";

export const meta: Route.MetaFunction = () => [{ title: "Reviews · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  const exhibits = await readExhibits(requireActor(context));
  return { exhibits: exhibits.filter((one) => one.state !== "draft") };
});

export default function Reviews({ loaderData: { exhibits } }: Route.ComponentProps) {
  return (
    <>
      <PageHead title="Reviews" subtitle="two other pairs of eyes on every number" />
      <Table
        caption="Exhibits under review"
        captionHidden
        rows={exhibits}
        rowKey={(row) => row.id}
        empty={<EmptyState title="Nothing is under review">Curators submit an exhibit from its page.</EmptyState>}
        columns={[
          {
            id: "title",
            head: "Exhibit",
            rowHead: true,
            cell: (row) => (
              <Link to={`/reviews/${row.id}`} className="link">
                {row.titleEn}
              </Link>
            ),
          },
          { id: "scenes", head: "Scenes", numeric: true, cell: (row) => row.scenes },
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
