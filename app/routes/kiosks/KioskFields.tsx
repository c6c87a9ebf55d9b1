import { Field } from "#app/ui/Field.tsx";
import { RadioGroup } from "#app/ui/RadioGroup.tsx";
import type { formState } from "../form-state.ts";

/** What a kiosk is: its name, its place, its first language, its patience. */
export function KioskFields({ form }: { form: ReturnType<typeof formState> }) {
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <>
      <Field label="Name" required {...field("name")} />
      <Field label="Station" hint="Where in the gallery it stands." required {...field("station")} />
      <RadioGroup
        label="First language"
        inline
        options={[
          { value: "en", label: "English" },
          { value: "fr", label: "Français" },
        ]}
        {...field("language")}
      />
      <Field
        label="Starts again after"
        unit="seconds without a touch"
        inputMode="numeric"
        hint="It asks before it does."
        {...field("idleSeconds")}
      />
    </>
  );
}
