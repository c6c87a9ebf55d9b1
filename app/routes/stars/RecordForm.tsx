import { Form, Link } from "react-router";
import { RECORD_KINDS } from "#app/database/enums.ts";
import type { FormProblem } from "#app/http.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { formState } from "../form-state.ts";
import { KIND_WORDS } from "./words.ts";

interface RecordFormProps {
  actionData: FormProblem | undefined;
  saved: Readonly<Record<string, string | number | null>>;
  sources: readonly { id: string; citation: string }[];
  hidden?: Readonly<Record<string, string | number>>;
  cancelTo: string;
}

/** A record's names, identifiers and position; for new ones and for kept ones. */
export function RecordForm({ actionData, saved, sources, hidden = {}, cancelTo }: RecordFormProps) {
  const form = formState(actionData, saved);
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <Form method="post" noValidate className="grid gap-10">
      <FormErrors errors={form.errors} links={form.links} />
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <div className="grid gap-x-14 gap-y-10 lg:grid-cols-2">
        <fieldset className="grid content-start gap-5">
          <legend className="mb-4 font-head text-lg font-medium">What it is called</legend>
          <Field label="Name" hint="As visitors read it in English." required {...field("name")} />
          <Select
            label="Kind"
            options={RECORD_KINDS.map((kind) => ({ value: kind, label: KIND_WORDS[kind] }))}
            {...field("kind")}
          />
          <TextArea
            label="Other names"
            hint="One a line; begin a line with fr: for the French one. Others: α Lyrae."
            rows={3}
            {...field("otherNames")}
          />
          <TextArea
            label="Identifiers"
            hint="One a line: HIP 91262, HD 172167, HR 7001, GJ 721, Gaia DR3 …, M 45, NGC …"
            rows={3}
            {...field("identifiers")}
          />
        </fieldset>
        <fieldset className="grid content-start gap-5">
          <legend className="mb-4 font-head text-lg font-medium">Where it stands (ICRS)</legend>
          <div className="grid gap-5 sm:grid-cols-2">
            <Field label="Right ascension" hint="Degrees, or 18 36 56.34." {...field("ra")} />
            <Field label="Declination" hint="Degrees, or +38 47 01.3." {...field("dec")} />
          </div>
          <Field label="Epoch" hint="Julian year, such as 1991.25." inputMode="decimal" {...field("positionEpoch")} />
          <Select
            label="Source of the position"
            placeholder="None yet"
            options={sources.map((source) => ({ value: source.id, label: source.citation }))}
            {...field("positionSourceId")}
          />
          <Field label="Where in the source" hint="Table, column, row." {...field("positionLocator")} />
          <Field label="Note on the position" {...field("positionNote")} />
        </fieldset>
      </div>
      <div className="flex flex-wrap items-center gap-4">
        <SubmitButton>Keep the record</SubmitButton>
        <Link to={cancelTo} className="link">
          Leave it
        </Link>
      </div>
    </Form>
  );
}
