import { redirect } from "react-router";
import { createSource } from "#app/catalogue/create-source.server.ts";
import { CreateSource } from "#app/catalogue/source-input.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { PageHead } from "#app/ui/PageHead.tsx";
import type { Route } from "./+types/new";
import { SourceForm } from "./SourceForm.tsx";

export const meta: Route.MetaFunction = () => [{ title: "New source · Alidade" }];

export const loader = answered(({ context }: Route.LoaderArgs) => {
  authorise(requireActor(context), "source.write");
  return null;
});

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const input = parseInput(CreateSource, await readForm(request));
  return redirect(`/sources/${await createSource(requireActor(context), input)}`);
});

export default function NewSource({ actionData }: Route.ComponentProps) {
  return (
    <>
      <PageHead title="New source" crumbs={[{ label: "Sources", to: "/sources" }]} />
      <SourceForm actionData={actionData} cancelTo="/sources" />
    </>
  );
}
