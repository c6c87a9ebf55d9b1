import { useState } from "react";
import { Form } from "react-router";
import { QUANTITY_FACTS, toCanonical } from "#app/catalogue/quantities.ts";
import { QUANTITIES, type Quantity } from "#app/database/enums.ts";
import type { FormProblem } from "#app/http.server.ts";
import { Checkbox } from "#app/ui/Checkbox.tsx";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";
import { LiveDistance } from "./LiveDistance.tsx";

const UNITS = [...new Set(QUANTITIES.flatMap((quantity) => Object.keys(QUANTITY_FACTS[quantity].units)))];

interface MeasurementFormProps {
  recordId: string;
  actionData: FormProblem | undefined;
  sources: readonly { id: string; citation: string }[];
}

/** "130.23 ± 0.36" or the two apart, for asking what would follow. Parsing proper is the server's. */
function typedNumbers(printed: string, error: string, unit: string) {
  const [value = "", apart = ""] = printed.replaceAll("\u2212", "-").split(/±|\+\/?-/);
  const inMas = (text: string) => {
    const known =
      text.trim() !== "" && Number.isFinite(Number(text)) && Object.hasOwn(QUANTITY_FACTS.parallax.units, unit);
    return known ? String(toCanonical("parallax", text.trim(), unit)) : text.trim();
  };
  return { parallax: inMas(value), error: inMas(apart || error) };
}

export function MeasurementForm({ recordId, actionData, sources }: MeasurementFormProps) {
  const form = formState(actionData, { quantity: "parallax", unit: "mas" }, "measure");
  const [quantity, setQuantity] = useState(form.value("quantity") as Quantity);
  const [printed, setPrinted] = useState(form.value("printed"));
  const [error, setError] = useState(form.value("error"));
  const [unit, setUnit] = useState(form.value("unit"));
  const id = (name: string) => `measure-${name}`;
  const field = (name: string) => ({ id: id(name), name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <Form method="post" noValidate className="grid gap-5">
      <FormErrors errors={form.errors} idFor={id} />
      <input type="hidden" name="recordId" value={recordId} />
      <div className="grid gap-5 sm:grid-cols-2">
        <Select
          label="Quantity"
          options={QUANTITIES.map((one) => ({ value: one, label: QUANTITY_FACTS[one].label }))}
          {...field("quantity")}
          onChange={(event) => {
            const next = event.currentTarget.value as Quantity;
            setQuantity(next);
            setUnit(QUANTITY_FACTS[next].canonical);
          }}
        />
        <Select
          label="Unit"
          options={UNITS.map((one) => ({ value: one, label: one }))}
          {...field("unit")}
          defaultValue={undefined}
          value={unit}
          onChange={(event) => setUnit(event.currentTarget.value)}
        />
        <Field
          label="As printed"
          hint="Word for word: 130.23, or 130.23 ± 0.36."
          required
          autoComplete="off"
          {...field("printed")}
          onChange={(event) => setPrinted(event.currentTarget.value)}
        />
        <Field
          label="Its error, if it stands apart"
          inputMode="decimal"
          autoComplete="off"
          {...field("error")}
          onChange={(event) => setError(event.currentTarget.value)}
        />
      </div>
      {quantity === "parallax" ? <LiveDistance {...typedNumbers(printed, error, unit)} prior="none" scale="" /> : null}
      <div className="grid gap-5 sm:grid-cols-2">
        <Select
          label="Source"
          placeholder="None yet"
          options={sources.map((source) => ({ value: source.id, label: source.citation }))}
          {...field("sourceId")}
        />
        <Field label="Where in the source" hint="Table, column, row." {...field("locator")} />
        <Field label="Epoch" hint="Julian year, such as 1991.25." inputMode="decimal" {...field("epoch")} />
        <Field label="Note" {...field("note")} />
      </div>
      <Checkbox
        id={id("fromMemory")}
        name="fromMemory"
        label="From memory, to be checked"
        hint="It says so until a scientist has compared it with its source."
        defaultChecked={form.ticked("fromMemory", false)}
      />
      <SubmitButton intent="measure" className="justify-self-start">
        Propose this measurement
      </SubmitButton>
    </Form>
  );
}
