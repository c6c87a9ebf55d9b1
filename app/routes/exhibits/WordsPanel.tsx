import { Form } from "react-router";
import { FIGURE_FORMS, FIGURE_QUANTITIES, FIGURE_UNITS } from "#app/database/enums.ts";
import type { readScene } from "#app/exhibits/read-scene.server.ts";
import type { FormProblem } from "#app/http.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { Field } from "#app/ui/Field.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { formState } from "../form-state.ts";
import { ReadWords } from "./ReadWords.tsx";

type Page = Awaited<ReturnType<typeof readScene>>;

interface WordsPanelProps extends Pick<Page, "exhibit" | "scene" | "resolved" | "words" | "figures"> {
  records: readonly { id: string; name: string }[];
  mayWrite: boolean;
  actionData: FormProblem | undefined;
}

const QUANTITY_WORDS = { distance: "its distance", "light-travel": "how long its light was on the way" };
const FORM_WORDS = { value: "value", range: "range", "value-and-range": "value with its range" };
const UNIT_WORDS = { ly: "light-years", pc: "parsecs", au: "astronomical units", km: "kilometres" };

export function WordsPanel(props: WordsPanelProps) {
  const { exhibit, scene, resolved, words, mayWrite, actionData } = props;
  const form = formState(actionData, words, "save-words");
  const french = exhibit.languages.includes("fr");
  return (
    <div className="grid gap-8">
      <section>
        <p className="label mb-1">As a visitor reads it</p>
        <ReadWords scene={resolved} language="en" />
        {french ? <ReadWords scene={resolved} language="fr" /> : null}
      </section>
      <Figures {...props} />
      {mayWrite ? (
        <Form method="post" className="grid gap-5">
          <input type="hidden" name="sceneId" value={scene.id} />
          <input type="hidden" name="version" value={scene.version} />
          <TextArea
            label="Words in English"
            name="en"
            rows={8}
            hint="An empty line parts paragraphs. A number is written as the key of its figure, in braces: {vega}."
            defaultValue={form.value("en")}
            error={form.error("en")}
          />
          {french ? (
            <TextArea
              label="Words in French"
              name="fr"
              lang="fr"
              rows={8}
              defaultValue={form.value("fr")}
              error={form.error("fr")}
            />
          ) : (
            <input type="hidden" name="fr" value={words.fr} />
          )}
          <SubmitButton intent="save-words" className="justify-self-start">
            Keep the words
          </SubmitButton>
        </Form>
      ) : null}
    </div>
  );
}

function Figures({ scene, resolved, figures, records, mayWrite, actionData }: WordsPanelProps) {
  const name = (id: string) => records.find((one) => one.id === id)?.name ?? "a record";
  return (
    <section>
      <h2 className="mb-2 text-base">Bound figures</h2>
      {figures.length === 0 ? (
        <p className="text-ink-soft">None yet. Nobody types a number: bind it to a record.</p>
      ) : null}
      <ul className="border-t border-rule">
        {figures.map((figure) => (
          <li key={figure.key} className="flex flex-wrap items-baseline gap-x-3 border-b border-rule py-2">
            <code className="font-head font-medium">{`{${figure.key}}`}</code>
            <span>{resolved.figures[figure.key]?.en?.text ?? resolved.figures[figure.key]?.reason}</span>
            <span className="text-sm text-ink-soft">
              {name(figure.recordId)}, {QUANTITY_WORDS[figure.quantity]}, {FORM_WORDS[figure.form]}
            </span>
            {mayWrite ? (
              <Form method="post" preventScrollReset className="ml-auto">
                <input type="hidden" name="sceneId" value={scene.id} />
                <input type="hidden" name="version" value={scene.version} />
                <input type="hidden" name="key" value={figure.key} />
                <SubmitButton intent="unbind" look="plain" pending="…" aria-label={`Unbind {${figure.key}}`}>
                  unbind
                </SubmitButton>
              </Form>
            ) : null}
          </li>
        ))}
      </ul>
      {mayWrite ? <BindForm scene={scene} records={records} actionData={actionData} /> : null}
    </section>
  );
}

function BindForm({ scene, records, actionData }: Pick<WordsPanelProps, "scene" | "records" | "actionData">) {
  const form = formState(actionData, { quantity: "distance", unit: "ly", form: "value" }, "bind");
  const id = (name: string) => `bind-${name}`;
  const field = (name: string) => ({ id: id(name), name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <Disclosure summary="Bind a figure" open={Boolean(form.errors)}>
      <Form method="post" className="grid gap-4">
        <input type="hidden" name="sceneId" value={scene.id} />
        <input type="hidden" name="version" value={scene.version} />
        <Field label="Key" hint="How the words name it, such as vega." autoComplete="off" required {...field("key")} />
        <Select
          label="Whose number"
          placeholder="Choose a record"
          options={records.map((one) => ({ value: one.id, label: one.name }))}
          {...field("recordId")}
        />
        <Select
          label="Which number"
          options={FIGURE_QUANTITIES.map((one) => ({ value: one, label: QUANTITY_WORDS[one] }))}
          {...field("quantity")}
        />
        <div className="grid grid-cols-2 gap-4">
          <Select
            label="Unit"
            options={FIGURE_UNITS.map((one) => ({ value: one, label: UNIT_WORDS[one] }))}
            {...field("unit")}
          />
          <Select
            label="Shown as"
            options={FIGURE_FORMS.map((one) => ({ value: one, label: FORM_WORDS[one] }))}
            {...field("form")}
          />
        </div>
        <SubmitButton intent="bind" look="quiet" className="justify-self-start">
          Bind it
        </SubmitButton>
      </Form>
    </Disclosure>
  );
}
