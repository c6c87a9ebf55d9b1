import { redirect } from "react-router";
import { createRecord } from "#app/catalogue/create-record.server.ts";
import { readNewRecord } from "#app/catalogue/read-record.server.ts";
import { CreateRecord } from "#app/catalogue/record-input.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { PageHead } from "#app/ui/PageHead.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import type { Route } from "./+types/new";
import { RecordForm } from "./RecordForm.tsx";

export const meta: Route.MetaFunction = () => [{ title: "New record · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  return readNewRecord(requireActor(context));
});

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const input = parseInput(CreateRecord, await readForm(request));
  return redirect(`/stars/${await createRecord(requireActor(context), input)}?said=kept`);
});

export const shouldRevalidate = readAgainAfterConflict;

export default function NewRecord({ loaderData: { sources, submission }, actionData }: Route.ComponentProps) {
  return (
    <>
      <PageHead title="New record" crumbs={[{ label: "Stars", to: "/stars" }]} />
      <RecordForm
        actionData={actionData}
        saved={{ kind: "star" }}
        sources={sources}
        hidden={{ submission }}
        cancelTo="/stars"
      />
    </>
  );
}
