import { Link } from "react-router";
import { QUANTITY_FACTS } from "#app/catalogue/quantities.ts";
import type { readRecord } from "#app/catalogue/read-record.server.ts";
import { epochText, measurementText } from "#app/figures/office-numbers.ts";
import type { FormProblem } from "#app/http.server.ts";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import type { Domain } from "#app/ui/spread-geometry.ts";
import { type Column, Table } from "#app/ui/Table.tsx";
import { commonDomain } from "./common-domain.ts";
import { JudgeForm } from "./JudgeForm.tsx";
import { regimeOfParallax } from "./said.ts";
import { MEASUREMENT_STATE, REGIME_WORDS } from "./words.ts";

type Measured = Awaited<ReturnType<typeof readRecord>>["ledger"][number];

interface LedgerProps {
  ledger: readonly Measured[];
  adoptedId: string | null;
  actionData: FormProblem | undefined;
}

const spreadOf = (one: Measured) => {
  const error = one.errorCanonical ?? 0;
  return { value: one.valueCanonical, low: one.valueCanonical - error, high: one.valueCanonical + error };
};

/** A log axis has room for what is above zero only. What was set aside would only stretch it. */
const drawable = (one: Measured) =>
  one.state !== "rejected" && one.errorCanonical !== null && one.valueCanonical > one.errorCanonical;

function whyNoBar(row: Measured): string {
  if (row.state === "rejected") return "";
  return row.error === null ? "no error, no range" : "reaches zero";
}

export function Ledger(props: LedgerProps) {
  const parallaxes = props.ledger.filter((one) => one.quantity === "parallax");
  const others = props.ledger.filter((one) => one.quantity !== "parallax");
  const domain = commonDomain(parallaxes.filter(drawable).map(spreadOf), 0.2);
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
    <div>
      {valueText(row)}
      <div className="text-sm font-normal text-ink-soft">as printed “{row.rawText}”</div>
      {row.quantity === "parallax" ? <RegimeLine row={row} /> : null}
    </div>
  );
}

/** What may be said from this parallax, were it adopted. */
function RegimeLine({ row }: { row: Measured }) {
  const regime = regimeOfParallax(row);
  const words = regime === "no-error" ? "cannot be adopted" : REGIME_WORDS[regime];
  return <div className="text-sm font-normal text-ink-soft">{words}</div>;
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
  actionData,
}: { row: Measured; adopted: boolean } & Pick<LedgerProps, "actionData">) {
  const { word, tone } = MEASUREMENT_STATE[row.state];
  return (
    <div className="grid justify-items-start gap-1 max-md:justify-items-end">
      <span className="flex flex-wrap gap-2">
        {adopted ? <StateMark tone="none">adopted</StateMark> : null}
        <StateMark tone={tone}>{word}</StateMark>
        {row.fromMemory ? <StateMark tone="person">from memory</StateMark> : null}
      </span>
      {row.stateReason ? <span className="text-sm text-ink-soft">{row.stateReason}</span> : null}
      {row.state === "rejected" ? null : (
        <JudgeForm
          what={`${QUANTITY_FACTS[row.quantity].label} ${valueText(row)}`}
          measurement={row}
          mayConfirm={row.mayConfirm}
          mayReject={row.mayReject && !adopted}
          actionData={actionData}
        />
      )}
    </div>
  );
}

function parallaxColumns({ adoptedId, actionData }: LedgerProps, domain: Domain | undefined): Column<Measured>[] {
  return [
    { id: "value", head: "Value", rowHead: true, className: "md:min-w-44", cell: (row) => <Printed row={row} /> },
    {
      id: "spread",
      head: "Spread",
      headHidden: true,
      className: "md:w-[24%]",
      cell: (row) =>
        drawable(row) ? (
          <SpreadBar {...spreadOf(row)} domain={domain} muted={row.id !== adoptedId} label={valueText(row)} />
        ) : (
          <span className="text-sm text-ink-soft">{whyNoBar(row)}</span>
        ),
    },
    { id: "source", head: "Source", cell: (row) => <SourceCell row={row} /> },
    {
      id: "state",
      head: "State",
      cell: (row) => <StateCell row={row} adopted={row.id === adoptedId} actionData={actionData} />,
    },
  ];
}

function otherColumns({ actionData }: LedgerProps): Column<Measured>[] {
  return [
    {
      id: "quantity",
      head: "Quantity",
      rowHead: true,
      className: "md:min-w-28",
      cell: (row) => QUANTITY_FACTS[row.quantity].label,
    },
    { id: "value", head: "Value", numeric: true, cell: (row) => <Printed row={row} /> },
    { id: "source", head: "Source", cell: (row) => <SourceCell row={row} /> },
    {
      id: "state",
      head: "State",
      cell: (row) => <StateCell row={row} adopted={false} actionData={actionData} />,
    },
  ];
}
