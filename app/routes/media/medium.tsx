import { Form, Link, redirect } from "react-router";
import { readMediaUses } from "#app/exhibits/read-media-uses.server.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { editMedia } from "#app/media/edit-media.server.ts";
import { creditText } from "#app/media/licence-words.ts";
import { EditMedia } from "#app/media/media-input.ts";
import { readMedia } from "#app/media/read-media.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Picture } from "#app/ui/Picture.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/medium";
import { MediaFacts, MediaUses } from "./MediaFacts.tsx";
import { MediaFields } from "./MediaFields.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.medium.fileName ?? "Picture"} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  const [medium, uses] = await Promise.all([readMedia(actor, params.medium), readMediaUses(actor, params.medium)]);
  return {
    medium,
    uses,
    mayWrite: mayDo(actor.roles, "media.write"),
    said: new URL(request.url).searchParams.get("said"),
  };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  await editMedia(requireActor(context), parseInput(EditMedia, await readForm(request)));
  return redirect(`/media/${params.medium}?said=kept`);
});

const SAID: Record<string, string> = {
  kept: "Kept.",
  already: "This picture was kept before; here it is. Nothing was added.",
};

export default function Medium({ loaderData, actionData }: Route.ComponentProps) {
  const { medium, uses, mayWrite, said } = loaderData;
  const { creator, creditLine, licence, altEn, altFr } = medium;
  const form = formState(actionData, { creator, creditLine, licence, altEn, altFr });
  return (
    <>
      <PageHead title={medium.fileName} crumbs={[{ label: "Media", to: "/media" }]} />
      {said && Object.hasOwn(SAID, said) && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      <div className="grid gap-14 lg:grid-cols-[3fr_2fr]">
        <div className="grid min-w-0 content-start gap-10">
          <Picture
            sources={medium.sources}
            alt={altEn}
            width={medium.width}
            height={medium.height}
            sizes="(min-width: 64rem) 55vw, 100vw"
            credit={creditText(medium, "en")}
          />
          <MediaUses uses={uses} />
        </div>
        <div className="grid min-w-0 content-start gap-10">
          <MediaFacts medium={medium} />
          {mayWrite ? (
            <Form method="post" noValidate className="grid gap-5">
              <FormErrors errors={form.errors} />
              <input type="hidden" name="mediaId" value={medium.id} />
              <input type="hidden" name="version" value={medium.version} />
              <MediaFields form={form} />
              <SubmitButton className="justify-self-start">Keep the words</SubmitButton>
            </Form>
          ) : null}
          <p>
            <Link to={`/audit?type=media&object=${medium.id}`} className="link">
              What happened to this picture
            </Link>
          </p>
        </div>
      </div>
    </>
  );
}
