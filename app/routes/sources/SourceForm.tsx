import { Form, Link } from "react-router";
import type { FormProblem } from "#app/http.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { formState } from "../form-state.ts";

interface SourceFormProps {
  actionData: FormProblem | undefined;
  saved?: Readonly<Record<string, string | number | null>>;
  hidden?: Readonly<Record<string, string | number>>;
  cancelTo: string;
}

export function SourceForm({ actionData, saved = {}, hidden = {}, cancelTo }: SourceFormProps) {
  const form = formState(actionData, saved);
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <Form method="post" noValidate className="grid max-w-words gap-5">
      <FormErrors errors={form.errors} links={form.links} />
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <Field label="Title" required {...field("title")} />
      <Field label="Authors" hint="Family, Initials; Family, Initials." required {...field("authors")} />
      <div className="grid gap-5 sm:grid-cols-2">
        <Field label="Year" inputMode="numeric" required {...field("year")} />
        <Field label="Catalogue designation" hint="Such as I/311." {...field("designation")} />
      </div>
      <Field label="Bibcode" hint="19 characters, such as 2007A&A...474..653V." {...field("bibcode")} />
      <Field label="DOI" hint="A bibcode or a DOI is needed." {...field("doi")} />
      <TextArea label="Note" rows={3} {...field("note")} />
      <div className="flex flex-wrap items-center gap-4">
        <SubmitButton>Keep the source</SubmitButton>
        <Link to={cancelTo} className="link">
          Leave it
        </Link>
      </div>
    </Form>
  );
}
