import { Form } from "react-router";
import type { FormProblem } from "#app/http.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { Field } from "#app/ui/Field.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";

interface JudgeFormProps {
  /** The measurement in words, for those who hear the page. */
  what: string;
  measurement: { id: string; version: number };
  mayConfirm: boolean;
  mayReject: boolean;
  actionData: FormProblem | undefined;
}

/** Compares a measurement with its source, or sets it aside. */
export function JudgeForm({ what, measurement, mayConfirm, mayReject, actionData }: JudgeFormProps) {
  const refused = actionData?.problem.values.measurementId === measurement.id ? actionData : undefined;
  const form = formState(refused);
  if (!mayConfirm && !mayReject) return null;
  return (
    <Disclosure
      summary={
        <span>
          {mayConfirm ? "Judge it" : "Set it aside"}
          <span className="sr-only">: {what}</span>
        </span>
      }
      open={Boolean(form.errors)}
      className="w-full border-b-0 text-left"
    >
      <Form method="post" noValidate className="grid gap-3">
        <input type="hidden" name="measurementId" value={measurement.id} />
        <input type="hidden" name="version" value={measurement.version} />
        <Field
          id={`why-${measurement.id}`}
          label={mayConfirm ? "What you found" : "Why"}
          name="reason"
          required
          defaultValue={form.value("reason")}
          error={form.error("reason")}
        />
        <div className="flex flex-wrap gap-2">
          {mayConfirm ? (
            <SubmitButton intent="confirm" look="quiet">
              It agrees with its source
            </SubmitButton>
          ) : null}
          {mayReject ? (
            <SubmitButton intent="reject" look="danger">
              Set it aside
            </SubmitButton>
          ) : null}
        </div>
      </Form>
    </Disclosure>
  );
}
