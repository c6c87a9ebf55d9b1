import { Form, Link, redirect } from "react-router";
import { readIntakes } from "#app/catalogue/intake/read-intakes.server.ts";
import { uploadTable } from "#app/catalogue/intake/upload-table.server.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import { answered, answeredAction } from "#app/http.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Table } from "#app/ui/Table.tsx";
import { Time } from "#app/ui/Time.tsx";
import { readUpload } from "#app/upload.server.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/intakes";
import { INTAKE_STATE } from "./words.ts";

const MOST_BYTES = 10 * 1024 * 1024;

export const meta: Route.MetaFunction = () => [{ title: "Intake · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => ({
  intakes: await readIntakes(requireActor(context)),
}));

export const action = answeredAction(async ({ request, context }: Route.ActionArgs) => {
  const actor = requireActor(context);
  authorise(actor, "intake.write");
  const { upload } = await readUpload(request, "file", MOST_BYTES);
  const { intakeId, alreadySent } = await uploadTable(actor, upload);
  return redirect(`/intake/${intakeId}${alreadySent ? "?said=already" : ""}`);
});

export default function Intakes({ loaderData: { intakes }, actionData }: Route.ComponentProps) {
  const form = formState(actionData);
  return (
    <>
      <PageHead title="Intake" subtitle="published tables, row by row" />
      <Form method="post" encType="multipart/form-data" noValidate className="mb-12 grid max-w-words gap-5">
        <FormErrors errors={form.errors} />
        <Field
          label="A table to bring in"
          name="file"
          type="file"
          accept=".csv,.tsv,.txt,.vot,.xml,text/csv,application/x-votable+xml"
          hint="CSV (commas, semicolons, tabs) or VOTable in TABLEDATA, at most 10 MB. Nothing is in the catalogue until you have seen what would happen."
          error={form.error("file")}
          required
        />
        <SubmitButton pending="Reading…" className="justify-self-start">
          Read this table
        </SubmitButton>
      </Form>
      <Table
        caption="Tables so far"
        rows={intakes}
        rowKey={(row) => row.id}
        empty={<EmptyState title="No table yet">What was brought in stands here, with what became of it.</EmptyState>}
        columns={[
          {
            id: "file",
            head: "File",
            rowHead: true,
            cell: (row) => (
              <>
                <Link to={`/intake/${row.id}`} className="link break-all">
                  {row.fileName}
                </Link>
                <div className="text-sm font-normal text-ink-soft">
                  <Time at={row.createdAt} form="moment" /> by {row.by}
                </div>
              </>
            ),
          },
          { id: "rows", head: "Rows", numeric: true, cell: (row) => plainNumber(row.rowCount, "en") },
          { id: "new", head: "New", numeric: true, cell: (row) => plainNumber(row.createdCount, "en") },
          { id: "changed", head: "Added to", numeric: true, cell: (row) => plainNumber(row.updatedCount, "en") },
          { id: "same", head: "Same", numeric: true, cell: (row) => plainNumber(row.sameCount, "en") },
          { id: "bad", head: "Left out", numeric: true, cell: (row) => plainNumber(row.badCount, "en") },
          {
            id: "state",
            head: "State",
            cell: (row) => <StateMark tone={INTAKE_STATE[row.state].tone}>{INTAKE_STATE[row.state].word}</StateMark>,
          },
        ]}
      />
    </>
  );
}
