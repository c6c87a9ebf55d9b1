import { Link } from "react-router";
import { answered } from "#app/http.server.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { readDesk } from "#app/review/read-desk.server.ts";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { EXHIBIT_STATE } from "../exhibits/words.ts";
import type { Route } from "./+types/desk";

export const meta: Route.MetaFunction = () => [{ title: "Desk · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return { ...(await readDesk(actor)), name: actor.name };
});

export default function Desk({ loaderData }: Route.ComponentProps) {
  const { yours, underway, toVet, name } = loaderData;
  const elsewhere = underway.filter((one) => !yours.some((mine) => mine.id === one.id));
  return (
    <>
      <PageHead title="Desk" subtitle={name} />
      <div className="grid gap-14 lg:grid-cols-2">
        <section>
          <h2 className="mb-3">Your turn</h2>
          {yours.length === 0 && toVet.length === 0 ? <p className="text-ink-soft">Nothing waits for you.</p> : null}
          <Exhibits exhibits={yours} />
          {toVet.length > 0 ? (
            <>
              <h3 className="mt-8 mb-2">Records to vet</h3>
              <ul className="border-t border-rule">
                {toVet.map((one) => (
                  <li key={one.id} className="border-b border-rule py-2">
                    <Link to={`/stars/${one.id}`} className="link">
                      {one.name}
                    </Link>
                  </li>
                ))}
              </ul>
              <p className="mt-3">
                <Link to="/stars?state=draft" className="link">
                  All drafts
                </Link>
              </p>
            </>
          ) : null}
        </section>
        <section>
          <h2 className="mb-3">Under way</h2>
          {elsewhere.length === 0 ? <p className="text-ink-soft">No exhibit is with anybody else.</p> : null}
          <Exhibits exhibits={elsewhere} />
        </section>
      </div>
    </>
  );
}

type Listed = Route.ComponentProps["loaderData"]["yours"];

function Exhibits({ exhibits }: { exhibits: Listed }) {
  if (exhibits.length === 0) return null;
  return (
    <ul className="border-t border-rule">
      {exhibits.map((one) => (
        <li key={one.id} className="flex flex-wrap items-baseline gap-4 border-b border-rule py-3">
          <Link
            to={one.state === "draft" ? `/exhibits/${one.id}` : `/reviews/${one.id}`}
            className="link font-head text-lg"
          >
            {one.titleEn}
          </Link>
          <StateMark tone={EXHIBIT_STATE[one.state].tone}>{EXHIBIT_STATE[one.state].word}</StateMark>
        </li>
      ))}
    </ul>
  );
}
