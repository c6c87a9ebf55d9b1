import type { ReactNode } from "react";
import { classes } from "./classes.ts";
import type { FieldWords, Wiring } from "./field-wiring.ts";

interface FieldFrameProps extends Pick<FieldWords, "label" | "hint" | "labelHidden"> {
  wiring: Wiring;
  required?: boolean;
  className?: string;
  children: ReactNode;
}

/** Label, control, hint and errors in their order; used by every kind of field. */
export function FieldFrame({ label, hint, labelHidden, wiring, required, className, children }: FieldFrameProps) {
  return (
    <div className={classes("grid content-start gap-1", className)}>
      <label htmlFor={wiring.id} className={labelHidden ? "sr-only" : "font-head text-sm font-medium"}>
        {label}
        {required ? <RequiredWord /> : null}
      </label>
      {hint ? <FieldHint id={wiring.hintId}>{hint}</FieldHint> : null}
      {children}
      <FieldMessages wiring={wiring} />
    </div>
  );
}

/** For the eye only: the control itself says that it is required. */
export function RequiredWord() {
  return (
    <span aria-hidden="true" className="ml-2 font-body text-xs font-normal text-ink-soft">
      required
    </span>
  );
}

export function FieldHint({ id, children }: { id: string | undefined; children: ReactNode }) {
  return (
    <p id={id} className="text-sm text-ink-soft">
      {children}
    </p>
  );
}

export function FieldMessages({ wiring }: { wiring: Wiring }) {
  if (wiring.messages.length === 0) return null;
  return (
    <div id={wiring.errorId} className="border-l-2 border-vermilion pl-2 text-sm text-vermilion">
      {wiring.messages.map((message) => (
        <p key={message}>{message}</p>
      ))}
    </div>
  );
}
