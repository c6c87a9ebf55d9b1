import { Form, Link, redirect } from "react-router";
import { publishEdition } from "#app/editions/publish-edition.server.ts";
import { PublishEdition, ReissueEdition } from "#app/editions/publish-input.ts";
import { readExhibitEditions } from "#app/editions/read-editions.server.ts";
import { reissueEdition } from "#app/editions/reissue-edition.server.ts";
import { Invalid } from "#app/errors.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Table } from "#app/ui/Table.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { Time } from "#app/ui/Time.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import type { Route } from "./+types/exhibit-editions";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `Editions of ${loaderData?.exhibit.titleEn ?? ""} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return {
    ...(await readExhibitEditions(actor, params.exhibit)),
    mayPublish: mayDo(actor.roles, "edition.publish"),
    said: new URL(request.url).searchParams.get("said"),
  };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const back = (number: number) => redirect(`/editions/${params.exhibit}?said=${number}`);
  switch (form.get("intent")) {
    case "publish":
      return back(await publishEdition(actor, parseInput(PublishEdition, form)));
    case "reissue":
      return back(await reissueEdition(actor, parseInput(ReissueEdition, form)));
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

export default function ExhibitEditions({ loaderData, actionData }: Route.ComponentProps) {
  const { exhibit, editions, kiosks, said } = loaderData;
  return (
    <>
      <PageHead
        title={exhibit.titleEn}
        crumbs={[{ label: "Editions", to: "/editions" }]}
        subtitle={`feed/${exhibit.slug}.json`}
        actions={
          <Link to={`/exhibits/${exhibit.id}`} className="link">
            The exhibit
          </Link>
        }
      />
      {said && !actionData ? (
        <Notice tone="success">Edition {said} is published. Kiosks take it when nobody is touching them.</Notice>
      ) : null}
      <FormErrors errors={actionData?.problem.errors} idFor={() => "main"} />
      <div className="grid gap-14 lg:grid-cols-[3fr_2fr]">
        <Editions {...loaderData} />
        <div className="grid content-start gap-10">
          <Publish {...loaderData} />
          <section>
            <h2 className="mb-2">Shown on</h2>
            {kiosks.length === 0 ? <p className="text-ink-soft">No kiosk is assigned to it.</p> : null}
            <ul>
              {kiosks.map((one) => (
                <li key={one.id}>
                  <Link to={`/kiosks/${one.id}`} className="link">
                    {one.name}
                  </Link>
                </li>
              ))}
            </ul>
            {editions.length > 0 ? (
              <p className="mt-4">
                <a href={`/feed/${exhibit.slug}.json`} className="link">
                  The feed (JSON Feed 1.1)
                </a>
              </p>
            ) : null}
          </section>
        </div>
      </div>
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];

function Publish({ exhibit, digest, isApproved, isPublished, isOwnWork, mayPublish, editions }: Data) {
  const next = (editions[0]?.number ?? 0) + 1;
  const why = isPublished
    ? `Edition ${next - 1} has exactly this content.`
    : !isApproved
      ? "What stands there now is not approved. It goes through review first."
      : !mayPublish
        ? "Approved; a publisher publishes it."
        : isOwnWork
          ? "You have worked on this exhibit yourself, so somebody else has to publish it."
          : null;
  return (
    <section>
      <h2 className="mb-2">Publish edition {next}</h2>
      {why ? (
        <p className="text-ink-soft">{why}</p>
      ) : (
        <Form method="post" className="grid max-w-words gap-4">
          <input type="hidden" name="exhibitId" value={exhibit.id} />
          <input type="hidden" name="version" value={exhibit.version} />
          <input type="hidden" name="digest" value={digest} />
          <p>An edition never changes. To take it back is to issue another one with a higher number.</p>
          <TextArea id="publish-note" label="A note with it" name="note" rows={2} />
          <SubmitButton intent="publish" pending="Drawing and publishing…" className="justify-self-start">
            Publish edition {next}
          </SubmitButton>
        </Form>
      )}
    </section>
  );
}

function Editions({ exhibit, editions, mayPublish }: Data) {
  return (
    <Table
      caption="Editions"
      captionHidden
      rows={editions}
      rowKey={(row) => row.id}
      empty={<p className="text-ink-soft">Nothing of it is published yet.</p>}
      columns={[
        {
          id: "number",
          head: "Edition",
          rowHead: true,
          cell: (row) => (
            <span className="flex items-baseline gap-3">
              <span className="font-head text-xl">{row.number}</span>
              {row.number === editions[0]?.number ? <StateMark tone="live">live</StateMark> : null}
            </span>
          ),
        },
        {
          id: "published",
          head: "Published",
          cell: (row) => (
            <>
              <Time at={row.publishedAt} form="moment" /> by {row.publishedBy}
              {row.note ? <div className="text-sm text-ink-soft">{row.note}</div> : null}
            </>
          ),
        },
        {
          id: "digest",
          head: "Digest",
          cell: (row) => <code className="num break-all text-sm">{row.digest.slice(0, 16)}</code>,
        },
        {
          id: "again",
          head: "Issue it again",
          headHidden: true,
          cell: (row) =>
            mayPublish && row.number !== editions[0]?.number ? (
              <Disclosure summary="Issue it again" className="border-b-0">
                <Form method="post" className="grid gap-3">
                  <input type="hidden" name="exhibitId" value={exhibit.id} />
                  <input type="hidden" name="version" value={exhibit.version} />
                  <input type="hidden" name="number" value={row.number} />
                  <Field id={`why-${row.number}`} label="Why it comes back" name="note" required />
                  <SubmitButton intent="reissue" look="danger" pending="Publishing…">
                    Issue edition {row.number} again
                  </SubmitButton>
                </Form>
              </Disclosure>
            ) : null,
        },
      ]}
    />
  );
}
