import { useSearchParams } from "react-router";
import { DefinitionList } from "#app/ui/DefinitionList.tsx";
import { DiffRow } from "#app/ui/DiffRow.tsx";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { Pager } from "#app/ui/Pager.tsx";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { StateMark, type StateTone } from "#app/ui/StateMark.tsx";
import { type Column, Table } from "#app/ui/Table.tsx";
import { Pattern } from "./Chapter.tsx";

interface Row {
  name: string;
  parallax: string;
  spread: { value: number; low: number; high: number };
  source: string;
  tone: StateTone;
  state: string;
}

const ROWS: Row[] = [
  row("adopted", "130.23 ± 0.36", 130.23, 0.36, "van Leeuwen 2007, table I/311", "vetted", "vetted"),
  row("earlier reduction", "128.93 ± 0.55", 128.93, 0.55, "Perryman et al. 1997", "sealed", "sealed"),
  row("ground, mean", "128.1 ± 1.6", 128.1, 1.6, "entered from memory", "person", "needs a source"),
  row("a draft", "129 ± 3", 129, 3, "none yet", "none", "draft"),
];
const AXIS = [124, 134] as const;

function row(
  name: string,
  parallax: string,
  value: number,
  error: number,
  source: string,
  tone: StateTone,
  state: string,
) {
  return { name, parallax, spread: { value, low: value - error, high: value + error }, source, tone, state };
}

const COLUMNS: Column<Row>[] = [
  { id: "name", head: "Parallax", cell: (one) => one.name, rowHead: true, sortable: true },
  { id: "value", head: "mas", cell: (one) => one.parallax, numeric: true, sortable: true },
  {
    id: "spread",
    head: "Spread",
    headHidden: true,
    cell: (one) => (
      <SpreadBar {...one.spread} domain={AXIS} muted={one.tone !== "vetted"} label={`${one.parallax} mas`} />
    ),
    className: "md:w-40",
  },
  { id: "source", head: "Source", cell: (one) => one.source },
  { id: "state", head: "State", cell: (one) => <StateMark tone={one.tone}>{one.state}</StateMark> },
];

export function TablePatterns() {
  const [query] = useSearchParams();
  const direction = query.get("dir") === "desc" ? "descending" : "ascending";
  return (
    <>
      <Pattern title="A table with an order">
        <Table
          caption="Parallaxes of one star"
          columns={COLUMNS}
          rows={direction === "ascending" ? ROWS : ROWS.toReversed()}
          rowKey={(one) => one.name}
          sort={{ column: query.get("sort") ?? "value", direction }}
        />
        <Pager summary="1 to 4 of 104" next="?chapter=tables&page=2" />
      </Pattern>
      <div className="grid gap-x-14 lg:grid-cols-2">
        <Pattern title="A table with no rows">
          <Table
            caption="Nothing"
            columns={COLUMNS}
            rows={[]}
            rowKey={(one) => one.name}
            empty={
              <EmptyState title="No measurement yet" actions={<LinkButton to="?chapter=forms">Enter one</LinkButton>}>
                A distance needs a cited measurement first.
              </EmptyState>
            }
          />
        </Pattern>
        <Pattern title="Facts">
          <DefinitionList
            items={[
              { term: "Right ascension", value: "18 36 56.336", note: "ICRS, epoch 1991.25" },
              { term: "Kind", value: "star" },
            ]}
          />
        </Pattern>
        <Pattern title="A ledger">
          <DefinitionList
            ledger
            items={[
              { term: "Positions", value: <StateMark tone="live">to scale</StateMark> },
              { term: "Sizes", value: <StateMark tone="person">not to scale</StateMark> },
            ]}
          />
        </Pattern>
        <Pattern title="Folded away">
          <Disclosure summary="Unfold the arithmetic">
            <p>One over the parallax is the distance in parsecs, where the error is small.</p>
          </Disclosure>
          <Disclosure summary="Already unfolded" open>
            <p>It stays open until it is closed.</p>
          </Disclosure>
        </Pattern>
      </div>
      <Pattern title="What changed">
        <DiffRow
          label="Words, English"
          before="25.0 light-years"
          after="25.1 light-years"
          verdict={<StateMark tone="person">reads differently</StateMark>}
        />
        <DiffRow
          label="Parallax"
          before="130.23 mas"
          after="130.230 mas"
          verdict={<StateMark tone="vetted">reads the same</StateMark>}
        />
        <DiffRow label="Credit line" before={null} after="Tern Point Science Centre" />
      </Pattern>
    </>
  );
}
