import { Form } from "react-router";
import type { FormProblem } from "#app/http.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { formState } from "../form-state.ts";

interface VettingPanelProps {
  record: { id: string; version: number; state: "draft" | "vetted" };
  /** The ledger as it is shown. */
  ledgerMark: string;
  missing: readonly { field: string; message: string }[];
  isOwnWork: boolean;
  mayVet: boolean;
  actionData: FormProblem | undefined;
}

/** What stands between a record and being vetted, and the button where nothing does. */
export function VettingPanel(props: VettingPanelProps) {
  const { record, missing } = props;
  if (record.state === "vetted") return props.mayVet ? <Unvet {...props} /> : null;
  return (
    <section aria-labelledby="vetting">
      <h2 id="vetting" className="mb-2">
        Before it can be vetted
      </h2>
      {missing.length > 0 ? (
        <ul className="list-disc pl-5">
          {missing.map((one) => (
            <li key={one.field}>{one.message}</li>
          ))}
        </ul>
      ) : (
        <p>Nothing is missing. It waits for a scientist who entered none of it.</p>
      )}
      <Vet {...props} />
    </section>
  );
}

function Seen({ record }: Pick<VettingPanelProps, "record">) {
  return (
    <>
      <input type="hidden" name="recordId" value={record.id} />
      <input type="hidden" name="version" value={record.version} />
    </>
  );
}

function Vet({ record, ledgerMark, missing, isOwnWork, mayVet }: VettingPanelProps) {
  if (!mayVet) return null;
  if (isOwnWork) {
    return <p className="mt-2 text-ink-soft">You have entered some of it, so somebody else has to vet it.</p>;
  }
  if (missing.length > 0) return null;
  return (
    <Form method="post" className="mt-4">
      <Seen record={record} />
      <input type="hidden" name="ledger" value={ledgerMark} />
      <SubmitButton intent="vet">Vet this record</SubmitButton>
    </Form>
  );
}

function Unvet({ record, actionData }: VettingPanelProps) {
  const form = formState(actionData, {}, "unvet");
  return (
    <Disclosure summary="Take the vetting back" open={Boolean(form.errors)}>
      <Form method="post" noValidate className="grid max-w-words gap-4">
        <Seen record={record} />
        <TextArea
          id="unvet-reason"
          label="Why"
          name="reason"
          rows={2}
          required
          defaultValue={form.value("reason")}
          error={form.error("reason")}
        />
        <SubmitButton intent="unvet" look="danger" className="justify-self-start">
          Make it a draft again
        </SubmitButton>
      </Form>
    </Disclosure>
  );
}
