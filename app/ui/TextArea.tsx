import type { ComponentProps } from "react";
import { FieldFrame } from "./FieldFrame.tsx";
import { CONTROL_CLASS, type FieldWords, wireField } from "./field-wiring.ts";

export interface TextAreaProps extends Omit<ComponentProps<"textarea">, "className" | "children">, FieldWords {
  className?: string;
}

export function TextArea({ label, hint, error, labelHidden, className, rows = 4, ...input }: TextAreaProps) {
  const wiring = wireField({
    id: input.id,
    name: input.name,
    hint,
    error,
    describedBy: input["aria-describedby"],
  });
  return (
    <FieldFrame
      label={label}
      hint={hint}
      labelHidden={labelHidden}
      wiring={wiring}
      required={input.required}
      className={className}
    >
      <textarea {...input} rows={rows} id={wiring.id} {...wiring.aria} className={CONTROL_CLASS} />
    </FieldFrame>
  );
}
