import { Form, Link } from "react-router";
import { quantityOf } from "#app/catalogue/intake/meanings.ts";
import type { readIntake } from "#app/catalogue/intake/read-intakes.server.ts";
import { QUANTITY_FACTS } from "#app/catalogue/quantities.ts";
import { QUANTITIES } from "#app/database/enums.ts";
import type { FormProblem } from "#app/http.server.ts";
import { Checkbox } from "#app/ui/Checkbox.tsx";
import { Field } from "#app/ui/Field.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { type Column, Table } from "#app/ui/Table.tsx";
import { formState } from "../form-state.ts";
import { MEANING_OPTIONS } from "./words.ts";

type Page = Awaited<ReturnType<typeof readIntake>>;
type Placed = Page["columns"][number] & { at: number };
type FormState = ReturnType<typeof formState>;

const UNITS = [...new Set(QUANTITIES.flatMap((quantity) => Object.keys(QUANTITY_FACTS[quantity].units)))];
const CATALOGUES = ["HIP", "HD", "HR", "GJ", "Gaia DR3", "M", "NGC"];

/** What each column means, and what holds for all rows. */
export function MappingForm({
  intake,
  columns,
  options,
  sources,
  actionData,
}: Pick<Page, "intake" | "columns" | "options" | "sources"> & { actionData: FormProblem | undefined }) {
  const saved = {
    sourceId: options.sourceId,
    locator: options.locator,
    epoch: options.epoch,
    positionEpoch: options.positionEpoch,
    namePrefix: options.namePrefix,
    adoptReason: options.adoptReason,
    ...Object.fromEntries(
      columns.flatMap(({ use }, at) => [
        [`meaning-${at}`, use.meaning],
        [`unit-${at}`, use.unit],
        [`catalogue-${at}`, use.catalogue],
      ]),
    ),
  };
  const form = formState(actionData, saved, "map");
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  return (
    <Form method="post" noValidate className="grid gap-10" key={intake.version}>
      <input type="hidden" name="version" value={intake.version} />
      <Table
        caption="What the columns mean"
        rows={columns.map((column, at) => ({ ...column, at }))}
        rowKey={(row) => String(row.at)}
        columns={columnsOf(form)}
      />
      <fieldset className="grid max-w-[64rem] gap-5 sm:grid-cols-2">
        <legend className="mb-4 font-head text-lg font-medium">What holds for every row</legend>
        <div className="grid content-start gap-2">
          <Select
            label="Source of this table"
            placeholder="Choose a source"
            options={sources.map((one) => ({ value: one.id, label: one.citation }))}
            required
            {...field("sourceId")}
          />
          <Link to="/sources/new" className="link text-sm">
            It is not among them: make a new source
          </Link>
        </div>
        <Field label="Where in the source" hint="The table's number; row and column are added." {...field("locator")} />
        <Field
          label="Epoch"
          hint="Julian year of positions and measurements, such as 2015.0."
          inputMode="decimal"
          required
          {...field("epoch")}
        />
        <Field
          label="Positions at another epoch"
          hint="Only where it differs: positions at 2000.0 beside parallaxes of 1991.25."
          inputMode="decimal"
          {...field("positionEpoch")}
        />
        <Field
          label="Call rows without a name"
          hint="This and the row's number, such as Cluster member 12."
          {...field("namePrefix")}
        />
        <div className="grid gap-3 sm:col-span-2">
          <Checkbox
            name="adopt"
            label="Adopt the parallax of each new record"
            hint="A scientist still vets every one of them."
            defaultChecked={form.ticked("adopt", options.adopt)}
          />
          <Field label="Why these parallaxes count" {...field("adoptReason")} className="max-w-words" />
        </div>
      </fieldset>
      <SubmitButton intent="map" pending="Looking at every row…" className="justify-self-start">
        See what would happen
      </SubmitButton>
    </Form>
  );
}

function columnsOf(form: FormState): Column<Placed>[] {
  const field = (name: string) => ({
    name,
    defaultValue: form.value(name),
    error: form.error(name),
    labelHidden: true,
  });
  return [
    {
      id: "name",
      head: "Column",
      rowHead: true,
      cell: (row) => (
        <>
          <span className="break-all">{row.name}</span>
          <div className="text-sm font-normal text-ink-soft">{[row.unit, row.ucd].filter(Boolean).join(", ")}</div>
        </>
      ),
    },
    {
      id: "samples",
      head: "First rows",
      cell: (row) => (
        <span className="num text-sm break-all text-ink-soft">{row.samples.filter(Boolean).join(" · ")}</span>
      ),
    },
    {
      id: "meaning",
      head: "Means",
      cell: (row) => (
        <Select label={`What ${row.name} means`} options={MEANING_OPTIONS} {...field(`meaning-${row.at}`)} />
      ),
    },
    {
      id: "unit",
      head: "In",
      cell: (row) =>
        form.value(`meaning-${row.at}`) === "identifier" ? (
          <Select
            label={`Whose identifier ${row.name} is`}
            placeholder="Choose a catalogue"
            options={CATALOGUES.map((one) => ({ value: one, label: one }))}
            {...field(`catalogue-${row.at}`)}
          />
        ) : (
          <Select
            label={`Unit of ${row.name}`}
            placeholder={quantityOf(row.use.meaning) ? "Choose a unit" : "no unit"}
            options={UNITS.map((one) => ({ value: one, label: one }))}
            {...field(`unit-${row.at}`)}
          />
        ),
    },
  ];
}
