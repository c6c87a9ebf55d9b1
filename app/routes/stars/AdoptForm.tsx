import { useState } from "react";
import { Form } from "react-router";
import { DEFAULT_LENGTH_PC } from "#app/catalogue/distance-query.ts";
import { toCanonical } from "#app/catalogue/quantities.ts";
import { PRIORS } from "#app/database/enums.ts";
import { measurementText, plainNumber } from "#app/figures/office-numbers.ts";
import type { FormProblem } from "#app/http.server.ts";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { formState } from "../form-state.ts";
import { LiveDistance } from "./LiveDistance.tsx";
import { PRIOR_WORDS } from "./words.ts";

interface Choice {
  id: string;
  value: string;
  error: string | null;
  unit: string;
  source: { citation: string } | null;
}

interface AdoptFormProps {
  record: {
    id: string;
    version: number;
    adoptedParallaxId: string | null;
    adoptedReason: string | null;
    prior: string | null;
    priorScalePc: number | null;
    priorReason: string | null;
  };
  choices: readonly Choice[];
  actionData: FormProblem | undefined;
}

const EDSD_HINT = `${plainNumber(DEFAULT_LENGTH_PC, "en")} for the whole sky (Astraatmadja & Bailer-Jones 2016).`;

/** Until a prior is chosen (or without JavaScript) it may be either. */
const SCALE_LABELS: Record<string, string> = {
  edsd: "Its length",
  "uniform-density": "Its limit",
  "uniform-distance": "Its limit",
};

const labelOf = ({ value, error, unit, source }: Choice) =>
  `${measurementText({ value, error, unit, language: "en" })}, ${source?.citation ?? "no source yet"}`;

export function AdoptForm({ record, choices, actionData }: AdoptFormProps) {
  const saved = {
    measurementId: record.adoptedParallaxId ?? choices[0]?.id,
    reason: record.adoptedReason,
    prior: record.prior ?? "none",
    priorScalePc: record.priorScalePc,
    priorReason: record.priorReason,
  };
  const form = formState(actionData, saved, "adopt");
  const [measurementId, setMeasurementId] = useState(form.value("measurementId"));
  const [prior, setPrior] = useState(form.value("prior"));
  const [scale, setScale] = useState(form.value("priorScalePc"));
  const chosen = choices.find((one) => one.id === measurementId);
  const id = (name: string) => `adopt-${name}`;
  const field = (name: string) => ({ id: id(name), name, defaultValue: form.value(name), error: form.error(name) });
  const mas = (text: string | null | undefined) =>
    chosen && text ? String(toCanonical("parallax", text, chosen.unit)) : "";
  return (
    <Form method="post" noValidate className="grid gap-5">
      <FormErrors errors={form.errors} idFor={id} />
      <input type="hidden" name="recordId" value={record.id} />
      <input type="hidden" name="version" value={record.version} />
      <Select
        label="The parallax that counts"
        options={choices.map((one) => ({ value: one.id, label: labelOf(one) }))}
        {...field("measurementId")}
        onChange={(event) => setMeasurementId(event.currentTarget.value)}
      />
      <TextArea label="Why this one" rows={2} required {...field("reason")} />
      <div className="grid gap-5 sm:grid-cols-2">
        <Select
          label="Prior"
          options={["none", ...PRIORS].map((one) => ({ value: one, label: PRIOR_WORDS[one] ?? one }))}
          {...field("prior")}
          onChange={(event) => setPrior(event.currentTarget.value)}
        />
        <Field
          label={SCALE_LABELS[prior] ?? "Its length or limit"}
          unit="pc"
          inputMode="decimal"
          hint={prior === "edsd" ? EDSD_HINT : "Only with a prior."}
          {...field("priorScalePc")}
          onChange={(event) => setScale(event.currentTarget.value)}
        />
      </div>
      <Field label="Why this prior" hint="Only with a prior." {...field("priorReason")} />
      <LiveDistance parallax={mas(chosen?.value)} error={mas(chosen?.error)} prior={prior} scale={scale} />
      <SubmitButton intent="adopt" className="justify-self-start">
        Adopt it
      </SubmitButton>
    </Form>
  );
}
