import { Form, Link } from "react-router";
import { QUANTITY_FACTS } from "#app/catalogue/quantities.ts";
import type { readRecord } from "#app/catalogue/read-record.server.ts";
import { epochText, measurementText } from "#app/figures/office-numbers.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { Field } from "#app/ui/Field.tsx";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { type Domain, fitDomain } from "#app/ui/spread-geometry.ts";
import { type Column, Table } from "#app/ui/Table.tsx";
import { MEASUREMENT_STATE } from "./words.ts";

type Measured = Awaited<ReturnType<typeof readRecord>>["ledger"][number];

interface LedgerProps {
  ledger: readonly Measured[];
  adoptedId: string | null;
  mayVet: boolean;
  personId: string;
}

const spreadOf = (one: Measured) => {
  const error = one.errorCanonical ?? 0;
  return { value: one.valueCanonical, low: one.valueCanonical - error, high: one.valueCanonical + error };
};

/** A log axis has room for what is above zero only. */
const drawable = (one: Measured) => one.errorCanonical !== null && one.valueCanonical > one.errorCanonical;

export function Ledger(props: LedgerProps) {
  const parallaxes = props.ledger.filter((one) => one.quantity === "parallax");
  const others = props.ledger.filter((one) => one.quantity !== "parallax");
  const domain = fitDomain(parallaxes.filter(drawable).map(spreadOf), 0.2);
  return (
    <div className="grid gap-10">
      <Table
        caption="Parallax"
        rows={parallaxes}
        rowKey={(row) => row.id}
        columns={parallaxColumns(props, domain)}
        empty={<p className="text-ink-soft">No parallax is kept yet.</p>}
      />
      {others.length > 0 ? (
        <Table caption="Also measured" rows={others} rowKey={(row) => row.id} columns={otherColumns(props)} />
      ) : null}
    </div>
  );
}

function valueText({ value, error, unit }: Measured): string {
  return measurementText({ value, error, unit, language: "en" });
}

function Printed({ row }: { row: Measured }) {
  return (
    <>
      {valueText(row)}
      <div className="text-sm font-normal text-ink-soft">as printed “{row.rawText}”</div>
    </>
  );
}

function SourceCell({ row }: { row: Measured }) {
  return (
    <>
      {row.source ? (
        <Link to={`/sources/${row.source.id}`} className="link">
          {row.source.citation}
        </Link>
      ) : (
        <StateMark tone="person">needs a source</StateMark>
      )}
      <div className="text-sm text-ink-soft">
        {[row.locator, row.epoch ? `epoch ${epochText(row.epoch)}` : null, row.note].filter(Boolean).join(", ")}
      </div>
    </>
  );
}

function StateCell({
  row,
  adopted,
  mayVet,
  personId,
}: {
  row: Measured;
  adopted: boolean;
  mayVet: boolean;
  personId: string;
}) {
  const { word, tone } = MEASUREMENT_STATE[row.state];
  return (
    <div className="grid justify-items-start gap-1 max-md:justify-items-end">
      <span className="flex flex-wrap gap-2">
        {adopted ? <StateMark tone="none">adopted</StateMark> : null}
        <StateMark tone={tone}>{word}</StateMark>
        {row.fromMemory ? <StateMark tone="person">from memory</StateMark> : null}
      </span>
      {row.stateReason ? <span className="text-sm text-ink-soft">{row.stateReason}</span> : null}
      {mayVet && row.state !== "rejected" ? (
        <Judge row={row} adopted={adopted} own={row.enteredById === personId} />
      ) : null}
    </div>
  );
}

/** What a scientist may do with a measurement: compare it with its source, or set it aside. */
function Judge({ row, adopted, own }: { row: Measured; adopted: boolean; own: boolean }) {
  const mayConfirm = row.fromMemory && !own && row.source;
  if (!mayConfirm && adopted) return null;
  return (
    <Disclosure summary="Judge it" className="w-full border-b-0 text-left">
      <Form method="post" className="grid gap-3">
        <input type="hidden" name="measurementId" value={row.id} />
        <input type="hidden" name="version" value={row.version} />
        <Field id={`why-${row.id}`} label="What you found" name="reason" required />
        <div className="flex flex-wrap gap-2">
          {mayConfirm ? (
            <SubmitButton intent="confirm" look="quiet">
              It agrees with its source
            </SubmitButton>
          ) : null}
          {adopted ? null : (
            <SubmitButton intent="reject" look="danger">
              Reject it
            </SubmitButton>
          )}
        </div>
      </Form>
    </Disclosure>
  );
}

function parallaxColumns({ adoptedId, mayVet, personId }: LedgerProps, domain: Domain): Column<Measured>[] {
  return [
    { id: "value", head: "Value", rowHead: true, cell: (row) => <Printed row={row} /> },
    {
      id: "spread",
      head: "Spread",
      headHidden: true,
      className: "w-[24%]",
      cell: (row) =>
        drawable(row) ? (
          <SpreadBar {...spreadOf(row)} domain={domain} muted={row.id !== adoptedId} label={valueText(row)} />
        ) : (
          <span className="text-sm text-ink-soft">{row.error === null ? "no error" : "reaches zero"}</span>
        ),
    },
    { id: "source", head: "Source", cell: (row) => <SourceCell row={row} /> },
    {
      id: "state",
      head: "State",
      cell: (row) => <StateCell row={row} adopted={row.id === adoptedId} mayVet={mayVet} personId={personId} />,
    },
  ];
}

function otherColumns({ mayVet, personId }: LedgerProps): Column<Measured>[] {
  return [
    { id: "quantity", head: "Quantity", rowHead: true, cell: (row) => QUANTITY_FACTS[row.quantity].label },
    { id: "value", head: "Value", numeric: true, cell: (row) => <Printed row={row} /> },
    { id: "source", head: "Source", cell: (row) => <SourceCell row={row} /> },
    {
      id: "state",
      head: "State",
      cell: (row) => <StateCell row={row} adopted={false} mayVet={mayVet} personId={personId} />,
    },
  ];
}
