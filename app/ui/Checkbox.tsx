import type { ComponentProps } from "react";
import { classes } from "./classes.ts";
import { FieldHint, FieldMessages } from "./FieldFrame.tsx";
import { type FieldWords, wireField } from "./field-wiring.ts";

export interface CheckboxProps
  extends Omit<ComponentProps<"input">, "className" | "children" | "type">,
    Omit<FieldWords, "labelHidden"> {
  type?: "checkbox";
  className?: string;
}

export function Checkbox({ label, hint, error, className, ...input }: CheckboxProps) {
  // Boxes of one name need ids of their own.
  const id = input.id ?? (input.value === undefined ? input.name : `${input.name}-${input.value}`);
  const wiring = wireField({ id, hint, error, describedBy: input["aria-describedby"] });
  return (
    <div className={classes("grid gap-1", className)}>
      <span className="tap flex items-center gap-3">
        <input {...input} type="checkbox" id={id} {...wiring.aria} className="size-5 shrink-0" />
        <label htmlFor={id} className="py-1">
          {label}
        </label>
      </span>
      <div className="pl-8 empty:hidden">
        {hint ? <FieldHint id={wiring.hintId}>{hint}</FieldHint> : null}
        <FieldMessages wiring={wiring} />
      </div>
    </div>
  );
}
