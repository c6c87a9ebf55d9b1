import { LICENCES } from "#app/database/enums.ts";
import { LICENCE_WORDS } from "#app/media/licence-words.ts";
import { Field } from "#app/ui/Field.tsx";
import { Select } from "#app/ui/Select.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import type { formState } from "../form-state.ts";

/** What a picture cannot be shown without. */
export function MediaFields({ form }: { form: ReturnType<typeof formState> }) {
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <>
      <Field label="Creator" hint="Who took it or made it." required {...field("creator")} />
      <Field label="Credit line" hint="Shown with it wherever it is shown." required {...field("creditLine")} />
      <Select
        label="Licence"
        placeholder="Choose a licence"
        options={LICENCES.map((one) => ({ value: one, label: LICENCE_WORDS.en[one] }))}
        required
        {...field("licence")}
      />
      <TextArea
        label="Alternative text"
        hint="What the picture shows, for those who do not see it."
        rows={2}
        required
        {...field("altEn")}
      />
      <TextArea
        label="Alternative text in French"
        hint="An exhibit that is also in French cannot be submitted without it."
        lang="fr"
        rows={2}
        {...field("altFr")}
      />
    </>
  );
}
