import { Form, Link } from "react-router";
import { readHistory } from "#app/audit/read-history.server.ts";
import { answered } from "#app/http.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Button } from "#app/ui/Button.tsx";
import { DiffRow } from "#app/ui/DiffRow.tsx";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Pager } from "#app/ui/Pager.tsx";
import { Select } from "#app/ui/Select.tsx";
import { Time } from "#app/ui/Time.tsx";
import type { Route } from "./+types/audit";

export const meta: Route.MetaFunction = () => [{ title: "Audit · Alidade" }];

const OBJECTS = ["record", "source", "exhibit", "kiosk", "media", "intake", "person"] as const;

export const loader = answered(async ({ context, request }: Route.LoaderArgs) => {
  authorise(requireActor(context), "audit.read");
  const query = new URL(request.url).searchParams;
  const filter = {
    objectType: query.get("type") || undefined,
    objectId: query.get("object") || undefined,
    personId: query.get("person") || undefined,
    before: query.get("before") || undefined,
  };
  return { ...(await readHistory(filter)), filter };
});

export default function Audit({ loaderData }: Route.ComponentProps) {
  const { entries, next, filter } = loaderData;
  const narrowed = Boolean(filter.objectType || filter.objectId || filter.personId);
  return (
    <>
      <PageHead
        title="Audit"
        subtitle={subtitleOf(loaderData)}
        actions={
          narrowed ? (
            <Link to="/audit" className="link">
              Everything
            </Link>
          ) : null
        }
      />
      <Form method="get" action="/audit" className="mb-8 flex flex-wrap items-end gap-4">
        <Select
          label="What was changed"
          name="type"
          placeholder="Anything"
          defaultValue={filter.objectType ?? ""}
          options={OBJECTS.map((type) => ({ value: type, label: type }))}
        />
        {filter.personId ? <input type="hidden" name="person" value={filter.personId} /> : null}
        <Button type="submit">Show</Button>
      </Form>
      {entries.length === 0 ? (
        <EmptyState title="Nothing is written down here">
          Every change leaves an entry that nobody can alter.
        </EmptyState>
      ) : (
        <ol className="border-t border-ink">
          {entries.map((entry) => (
            <li key={entry.id} className="border-b border-rule py-3">
              <Entry entry={entry} />
            </li>
          ))}
        </ol>
      )}
      <Pager summary={`${entries.length} entries, newest first`} next={next ? nextPage(filter, next) : null} />
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];

function subtitleOf({ entries, filter }: Data): string {
  const [first] = entries;
  if (filter.objectId) return first ? `of ${first.objectName}` : "of one object";
  if (filter.personId) return first ? `by ${first.personName}` : "by one person";
  return "who changed what, when";
}

function nextPage(filter: Data["filter"], before: string): string {
  const query = new URLSearchParams({ before });
  if (filter.objectType) query.set("type", filter.objectType);
  if (filter.objectId) query.set("object", filter.objectId);
  if (filter.personId) query.set("person", filter.personId);
  return `/audit?${query}`;
}

function Entry({ entry }: { entry: Data["entries"][number] }) {
  return (
    <>
      <p className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <span className="num text-sm text-ink-soft">
          <Time at={entry.at} form="moment" />
        </span>
        {entry.personId ? (
          <Link to={`/audit?person=${entry.personId}`} className="link">
            {entry.personName}
          </Link>
        ) : (
          <span>{entry.personName}</span>
        )}
        <span className="font-head text-sm">{entry.verb}</span>
        <Link to={`/audit?type=${entry.objectType}&object=${entry.objectId}`} className="link font-semibold">
          {entry.objectName}
        </Link>
      </p>
      {entry.note ? <p className="mt-1 text-ink-soft">{entry.note}</p> : null}
      {entry.differences.length > 0 ? (
        <Disclosure summary="Before and after" className="border-b-0">
          {entry.differences.map((one) => (
            <DiffRow key={one.field} label={one.field} before={one.before} after={one.after} />
          ))}
        </Disclosure>
      ) : null}
    </>
  );
}
