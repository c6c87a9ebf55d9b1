import { Form } from "react-router";
import { Button } from "#app/ui/Button.tsx";
import { Checkbox } from "#app/ui/Checkbox.tsx";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { RadioGroup } from "#app/ui/RadioGroup.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { type ChapterProps, Pattern } from "./Chapter.tsx";

const SOURCES = [
  { value: "a", label: "van Leeuwen 2007, table I/311" },
  { value: "b", label: "Perryman et al. 1997" },
];
const PRIORS = [
  { value: "none", label: "None", hint: "Enough while the error is below a fifth of the parallax." },
  { value: "edsd", label: "Exponentially decreasing space density" },
  { value: "uniform", label: "Uniform in distance", disabled: true },
];

export function FormPatterns({ errors }: ChapterProps) {
  return (
    <div className="grid gap-x-14 lg:grid-cols-[3fr_2fr]">
      <Pattern title="A form; sending it shows its errors">
        <Form method="post" noValidate className="grid max-w-words gap-5">
          <FormErrors errors={errors} />
          <Field label="Name" name="name" required defaultValue="Vega" autoComplete="off" />
          <Field
            label="Parallax"
            name="parallax"
            unit="mas"
            inputMode="decimal"
            hint="As printed in the source, sign and all."
            error={errors?.parallax}
            required
          />
          <Select
            label="Source"
            name="source"
            options={SOURCES}
            placeholder="Choose a source"
            error={errors?.source}
            required
          />
          <TextArea label="Reason" name="reason" hint="Read by whoever vets this." rows={3} />
          <RadioGroup label="Prior" name="prior" options={PRIORS} defaultValue="none" />
          <Checkbox label="From memory, to be checked" name="fromMemory" hint="Its state will say so until then." />
          <div className="flex flex-wrap gap-3">
            <SubmitButton intent="save">Save the measurement</SubmitButton>
            <SubmitButton intent="propose" look="quiet" pending="Sending…">
              Send to the scientist
            </SubmitButton>
            <LinkButton look="plain" to="?chapter=forms">
              Leave it
            </LinkButton>
          </div>
        </Form>
      </Pattern>
      <div>
        <Pattern title="Buttons">
          <div className="flex flex-wrap items-center gap-3">
            <Button look="primary">Primary</Button>
            <Button>Quiet</Button>
            <Button look="danger">Withdraw</Button>
            <Button look="plain">Undo</Button>
            <Button look="primary" disabled>
              Not yet
            </Button>
          </div>
        </Pattern>
        <Pattern title="Fields in other states">
          <div className="grid gap-5">
            <Field label="Revision" name="revision" defaultValue="7" readOnly />
            <Field label="Kind" name="kind" defaultValue="star" disabled />
            <Field label="Password" name="secret" type="password" autoComplete="off" />
            <Field label="A table to bring in" name="file" type="file" accept=".csv,.vot,.xml" hint="CSV or VOTable." />
            <RadioGroup
              label="Language"
              name="language"
              inline
              defaultValue="en"
              options={[
                { value: "en", label: "English" },
                { value: "fr", label: "Français" },
              ]}
            />
            <Field label="Find a star" labelHidden name="find" type="search" placeholder="Name or number" />
          </div>
        </Pattern>
      </div>
    </div>
  );
}
