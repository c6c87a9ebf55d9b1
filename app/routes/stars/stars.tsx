import { Form, Link } from "react-router";
import { convertLength } from "#app/astrometry/units.ts";
import { type RecordQuery, readRecords } from "#app/catalogue/read-records.server.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import { distanceFigure } from "#app/figures/range-figure.ts";
import { answered } from "#app/http.server.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Button } from "#app/ui/Button.tsx";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { Field } from "#app/ui/Field.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Pager } from "#app/ui/Pager.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import type { Domain } from "#app/ui/spread-geometry.ts";
import { type Column, Table } from "#app/ui/Table.tsx";
import type { Route } from "./+types/stars";
import { commonDomain } from "./common-domain.ts";
import { KIND_WORDS, REGIME_WORDS } from "./words.ts";

export const meta: Route.MetaFunction = () => [{ title: "Stars · Alidade" }];

function queryOf(url: URL): RecordQuery {
  const query = url.searchParams;
  const state = query.get("state");
  return {
    search: query.get("q") ?? "",
    state: state === "draft" || state === "vetted" ? state : null,
    sort: query.get("sort") === "distance" ? "distance" : "name",
    descending: query.get("dir") === "desc",
    after: query.get("after"),
    before: query.get("before"),
  };
}

export const loader = answered(async ({ context, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  const query = queryOf(new URL(request.url));
  return { ...(await readRecords(actor, query)), query, mayWrite: mayDo(actor.roles, "record.write") };
});

type Row = Route.ComponentProps["loaderData"]["rows"][number];

export default function Stars({ loaderData }: Route.ComponentProps) {
  const { rows, total, query, mayWrite } = loaderData;
  const domain = commonDomain(
    rows.flatMap((row) => (row.distancePc ? [inLightYears(row.distancePc)] : [])),
    0.1,
  );
  return (
    <>
      <PageHead
        title="Stars"
        subtitle={`${plainNumber(total, "en")} ${total === 1 ? "record" : "records"}`}
        actions={
          mayWrite ? (
            <LinkButton look="primary" to="/stars/new">
              New record
            </LinkButton>
          ) : null
        }
      />
      <Form method="get" action="/stars" role="search" className="mb-8 flex flex-wrap items-end gap-4">
        <Field
          label="Name or identifier"
          name="q"
          type="search"
          defaultValue={query.search}
          className="grow sm:max-w-80"
        />
        <Select
          label="State"
          name="state"
          placeholder="Any"
          defaultValue={query.state ?? ""}
          options={[
            { value: "draft", label: "draft" },
            { value: "vetted", label: "vetted" },
          ]}
        />
        <input type="hidden" name="sort" value={query.sort} />
        <Button type="submit">Search</Button>
      </Form>
      <Table
        caption="Records"
        captionHidden
        rows={rows}
        rowKey={(row) => row.id}
        columns={columns(domain)}
        sort={{ column: query.sort, direction: query.descending ? "descending" : "ascending" }}
        sortHref={(column, direction) =>
          pageHref(query, { sort: column, dir: direction === "ascending" ? "asc" : "desc" })
        }
        empty={<Nothing searching={Boolean(query.search || query.state)} mayWrite={mayWrite} />}
      />
      {rows.length > 0 ? (
        <Pager
          summary={`${plainNumber(rows.length, "en")} of ${plainNumber(total, "en")}`}
          previous={loaderData.previous ? pageHref(query, { before: loaderData.previous }) : null}
          next={loaderData.next ? pageHref(query, { after: loaderData.next }) : null}
        />
      ) : null}
    </>
  );
}

function pageHref(query: RecordQuery, change: Record<string, string>): string {
  const kept: Record<string, string> = { sort: query.sort, dir: query.descending ? "desc" : "asc" };
  if (query.search) kept.q = query.search;
  if (query.state) kept.state = query.state;
  return `/stars?${new URLSearchParams({ ...kept, ...change })}`;
}

function inLightYears({ value, low, high }: NonNullable<Row["distancePc"]>) {
  const to = (pc: number) => convertLength(pc, "pc", "ly");
  return { value: to(value), low: to(low), high: to(high) };
}

function columns(domain: Domain | undefined): Column<Row>[] {
  return [
    {
      id: "name",
      head: "Name",
      rowHead: true,
      sortable: true,
      cell: (row) => (
        <>
          <Link to={`/stars/${row.id}`} className="link">
            {row.name}
          </Link>
          <div className="text-sm font-normal text-ink-soft">{row.identifiers.join(", ") || KIND_WORDS[row.kind]}</div>
        </>
      ),
    },
    { id: "distance", head: "Distance", numeric: true, sortable: true, cell: (row) => <Distance row={row} /> },
    {
      id: "spread",
      head: "Range",
      headHidden: true,
      className: "md:w-[28%]",
      cell: (row) =>
        row.distancePc ? (
          <SpreadBar
            {...inLightYears(row.distancePc)}
            value={row.regime === "firm" ? inLightYears(row.distancePc).value : undefined}
            domain={domain}
            label={textOf(row) ?? ""}
          />
        ) : null,
    },
    { id: "regime", head: "Regime", cell: (row) => (row.regime ? REGIME_WORDS[row.regime] : "no parallax yet") },
    {
      id: "state",
      head: "State",
      cell: (row) => <StateMark tone={row.state === "vetted" ? "vetted" : "none"}>{row.state}</StateMark>,
    },
  ];
}

function textOf(row: Row): string | null {
  if (!row.distancePc || !row.regime || !row.method) return null;
  try {
    return distanceFigure({
      distance: inLightYears(row.distancePc),
      regime: row.regime,
      method: row.method,
      unit: "ly",
      form: "value",
      language: "en",
    }).text;
  } catch {
    return null;
  }
}

function Distance({ row }: { row: Row }) {
  return textOf(row) ?? <span className="text-ink-soft">{row.regime ? "nothing may be shown" : ""}</span>;
}

function Nothing({ searching, mayWrite }: { searching: boolean; mayWrite: boolean }) {
  if (searching) {
    return (
      <EmptyState
        title="No record fits"
        actions={
          <LinkButton look="quiet" to="/stars">
            Show all
          </LinkButton>
        }
      >
        Search by part of a name, or by an identifier such as HIP 91262.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="The catalogue is empty"
      actions={
        mayWrite ? (
          <>
            <LinkButton look="primary" to="/stars/new">
              New record
            </LinkButton>
            <LinkButton to="/intake">Bring a table in</LinkButton>
          </>
        ) : null
      }
    >
      Records come one by one, or as a published table.
    </EmptyState>
  );
}
