import { Link } from "react-router";
import { answered } from "#app/http.server.ts";
import { readKiosks } from "#app/kiosks/read-kiosks.server.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Table } from "#app/ui/Table.tsx";
import type { Route } from "./+types/kiosks";

export const meta: Route.MetaFunction = () => [{ title: "Kiosks · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return { kiosks: await readKiosks(actor), mayManage: mayDo(actor.roles, "kiosk.manage") };
});

export default function Kiosks({ loaderData: { kiosks, mayManage } }: Route.ComponentProps) {
  return (
    <>
      <PageHead
        title="Kiosks"
        subtitle="what visitors touch"
        actions={
          mayManage ? (
            <LinkButton look="primary" to="/kiosks/new">
              New kiosk
            </LinkButton>
          ) : null
        }
      />
      <Table
        caption="Kiosks"
        captionHidden
        rows={kiosks}
        rowKey={(row) => row.id}
        empty={
          <EmptyState title="No kiosk yet">An administrator sets one up; a publisher says what it shows.</EmptyState>
        }
        columns={[
          {
            id: "name",
            head: "Kiosk",
            rowHead: true,
            cell: (row) => (
              <>
                <Link to={`/kiosks/${row.id}`} className="link">
                  {row.name}
                </Link>
                <div className="text-sm font-normal text-ink-soft">{row.station}</div>
              </>
            ),
          },
          {
            id: "shows",
            head: "Shows",
            cell: (row) =>
              row.showing ? (
                <>
                  <Link to={`/editions/${row.showing.exhibitId}`} className="link">
                    {row.showing.title}
                  </Link>
                  <div className="text-sm text-ink-soft">edition {row.showing.edition}</div>
                </>
              ) : (
                <span className="text-ink-soft">nothing: it says that it rests</span>
              ),
          },
          {
            id: "state",
            head: "State",
            cell: (row) => (
              <StateMark tone={row.showing ? "live" : "none"}>{row.showing ? "live" : "resting"}</StateMark>
            ),
          },
          {
            id: "page",
            head: "Page",
            cell: (row) => (
              <a href={`/k/${row.slug}`} className="link">
                /k/{row.slug}
              </a>
            ),
          },
        ]}
      />
    </>
  );
}
