import { Form } from "react-router";
import type { readIntake } from "#app/catalogue/intake/read-intakes.server.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import { Checkbox } from "#app/ui/Checkbox.tsx";
import { DefinitionList } from "#app/ui/DefinitionList.tsx";
import { Pager } from "#app/ui/Pager.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Table } from "#app/ui/Table.tsx";

type Page = Awaited<ReturnType<typeof readIntake>>;
type ProblemPage = NonNullable<Page["dryRun"]>["problems"];

/** What would become of every row, and the button that makes it so. */
export function DryRun({ intake, dryRun }: { intake: Page["intake"]; dryRun: NonNullable<Page["dryRun"]> }) {
  const count = (value: number) => plainNumber(value, "en");
  const nothingNew = dryRun.created === 0 && dryRun.updated === 0;
  return (
    <section id="dry-run" className="mt-14">
      <h2 className="mb-4 text-xl">What would happen</h2>
      <DefinitionList
        ledger
        className="max-w-words"
        items={[
          { term: "New records", value: count(dryRun.created) },
          { term: "Records that get new measurements", value: count(dryRun.updated) },
          { term: "Rows of which everything is kept already", value: count(dryRun.same) },
          { term: "Bad rows", value: count(dryRun.bad) },
          ...(dryRun.notAboveZero > 0
            ? [
                {
                  term: "Parallaxes not above zero",
                  value: count(dryRun.notAboveZero),
                  note: "They are real measurements and are kept; nothing is inverted from them.",
                },
              ]
            : []),
        ]}
      />
      <Problems caption="Bad rows" name="problems" page={dryRun.problems} />
      <Problems caption="Rows to look at, taken all the same" name="warnings" page={dryRun.warnings} />
      {nothingNew ? (
        <p className="mt-6">There is nothing in it that is not in the catalogue already.</p>
      ) : (
        <Form method="post" className="mt-8 grid gap-4">
          <input type="hidden" name="version" value={intake.version} />
          {dryRun.bad > 0 ? (
            <Checkbox name="goodRowsOnly" label="Take the good rows and leave the bad ones out" />
          ) : null}
          <SubmitButton intent="apply" pending="Writing…" className="justify-self-start">
            Take it into the catalogue
          </SubmitButton>
        </Form>
      )}
    </section>
  );
}

function Problems({ caption, name, page }: { caption: string; name: string; page: ProblemPage }) {
  if (page.count === 0) return null;
  const to = (from: number | null) => (from === null ? null : `?${name}=${from}#${name}`);
  const count = (value: number) => plainNumber(value, "en");
  return (
    <div className="mt-8" id={name}>
      <Table
        caption={caption}
        rows={page.rows}
        rowKey={(row) => `${row.row} ${row.column} ${row.reason}`}
        columns={[
          { id: "row", head: "Row", numeric: true, rowHead: true, className: "w-16", cell: (row) => row.row },
          { id: "column", head: "Column", cell: (row) => row.column || "the whole row" },
          { id: "value", head: "Value", cell: (row) => <code className="break-all">{row.value || "empty"}</code> },
          { id: "reason", head: "Why", cell: (row) => row.reason },
        ]}
      />
      {page.previous === null && page.next === null ? null : (
        <Pager
          label={`Pages of ${caption.toLowerCase()}`}
          summary={`${count(page.from + 1)} to ${count(page.from + page.rows.length)} of ${count(page.count)}`}
          previous={to(page.previous)}
          next={to(page.next)}
        />
      )}
    </div>
  );
}
