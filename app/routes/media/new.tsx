import { Form, Link, redirect } from "react-router";
import { type FieldErrors, Invalid } from "#app/errors.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { UploadMedia } from "#app/media/media-input.ts";
import { uploadMedia } from "#app/media/upload-media.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { readUpload } from "#app/upload.server.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/new";
import { MediaFields } from "./MediaFields.tsx";

const MOST_BYTES = 30 * 1024 * 1024;

export const meta: Route.MetaFunction = () => [{ title: "New picture · Alidade" }];

export const loader = answered(({ context }: Route.LoaderArgs) => {
  authorise(requireActor(context), "media.write");
  return null;
});

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const actor = requireActor(context);
  authorise(actor, "media.write");
  const { form, upload } = await readPicture(request);
  const { mediaId, alreadyKept } = await uploadMedia(actor, parseInput(UploadMedia, form), upload);
  return redirect(`/media/${mediaId}?said=${alreadyKept ? "already" : "kept"}`);
});

/** A missing file must not hide what else is missing: everything is said at once. */
async function readPicture(request: Request) {
  try {
    return await readUpload(request, "file", MOST_BYTES);
  } catch (error) {
    if (error instanceof Invalid) throw new Invalid({ ...missingWords(await readForm(request)), ...error.fields });
    throw error;
  }
}

function missingWords(form: FormData): FieldErrors {
  try {
    parseInput(UploadMedia, form);
    return {};
  } catch (error) {
    if (error instanceof Invalid) return error.fields;
    throw error;
  }
}

export default function NewMedia({ actionData }: Route.ComponentProps) {
  const form = formState(actionData);
  return (
    <>
      <PageHead title="New picture" crumbs={[{ label: "Media", to: "/media" }]} />
      <Form method="post" encType="multipart/form-data" noValidate className="grid max-w-words gap-5">
        <FormErrors errors={form.errors} />
        <MediaFields form={form} />
        <Field
          label="The picture"
          name="file"
          type="file"
          accept="image/jpeg,image/png,image/webp,image/avif,image/tiff"
          hint="JPEG, PNG, WebP, AVIF or TIFF; at most 30 MB and 50 million pixels, at least 320 pixels wide."
          error={form.error("file")}
          required
        />
        <div className="flex flex-wrap items-center gap-4">
          <SubmitButton pending="Sending and encoding…">Keep the picture</SubmitButton>
          <Link to="/media" className="link">
            Leave it
          </Link>
        </div>
      </Form>
    </>
  );
}
