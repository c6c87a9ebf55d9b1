import { Link } from "react-router";
import { answered } from "#app/http.server.ts";
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
  return { media: await readMediaList(actor), mayWrite: mayDo(actor.roles, "media.write") };
});

export default function Media({ loaderData: { media, mayWrite } }: Route.ComponentProps) {
  const add = mayWrite ? (
    <LinkButton look="primary" to="/media/new">
      New picture
    </LinkButton>
  ) : null;
  return (
    <>
      <PageHead title="Media" subtitle="pictures, each with its credit" actions={add} />
      {media.length === 0 ? (
        <EmptyState title="No picture yet">
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
              credit={`${one.creditLine} (${one.licence})`}
            />
            <Link to={`/media/${one.id}`} className="link">
              {one.fileName}
            </Link>
          </li>
        ))}
      </ul>
    </>
  );
}
