import { Link } from "react-router";
import { countMediaUses } from "#app/exhibits/read-media-uses.server.ts";
import { answered } from "#app/http.server.ts";
import { creditText } from "#app/media/licence-words.ts";
import { readMediaList } from "#app/media/read-media.server.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Picture } from "#app/ui/Picture.tsx";
import type { Route } from "./+types/media";

export const meta: Route.MetaFunction = () => [{ title: "Media · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  const [media, uses] = await Promise.all([readMediaList(actor), countMediaUses(actor)]);
  return { media, uses, mayWrite: mayDo(actor.roles, "media.write") };
});

export default function Media({ loaderData: { media, uses, mayWrite } }: Route.ComponentProps) {
  const add = mayWrite ? (
    <LinkButton look="primary" to="/media/new">
      New picture
    </LinkButton>
  ) : null;
  return (
    <>
      <PageHead title="Media" subtitle="pictures, each with its credit" actions={media.length > 0 ? add : null} />
      {media.length === 0 ? (
        <EmptyState title="No picture yet" actions={add}>
          A picture is taken with its creator, credit line, licence and alternative text.
        </EmptyState>
      ) : null}
      <ul className="grid gap-8 sm:grid-cols-2 xl:grid-cols-3">
        {media.map((one) => (
          <li key={one.id}>
            <Picture
              sources={one.sources}
              alt={one.altEn}
              width={one.width}
              height={one.height}
              sizes="(min-width: 80rem) 28vw, (min-width: 40rem) 45vw, 100vw"
              credit={creditText(one, "en")}
            />
            <Link to={`/media/${one.id}`} className="link">
              {one.fileName}
            </Link>
            <span className="num text-sm text-ink-soft"> · {shownIn(uses[one.id] ?? 0)}</span>
          </li>
        ))}
      </ul>
    </>
  );
}

function shownIn(scenes: number): string {
  if (scenes === 0) return "shown nowhere yet";
  return scenes === 1 ? "shown in 1 scene" : `shown in ${scenes} scenes`;
}
