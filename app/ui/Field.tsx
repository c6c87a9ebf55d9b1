import type { ComponentProps } from "react";
import { classes } from "./classes.ts";
import { FieldFrame } from "./FieldFrame.tsx";
import { CONTROL_CLASS, type FieldWords, wireField } from "./field-wiring.ts";

export interface FieldProps extends Omit<ComponentProps<"input">, "className" | "children">, FieldWords {
  /** Printed behind the control and read with it: "mas", "pc". */
  unit?: string;
  className?: string;
}

/** A one-line input with its words. Takes plain props, or those of conform's `getInputProps`. */
export function Field({ label, hint, error, labelHidden, unit, className, ...input }: FieldProps) {
  const unitId = unit ? `${input.id ?? input.name}-unit` : undefined;
  const describedBy = classes(input["aria-describedby"], unitId) || undefined;
  const wiring = wireField({ id: input.id, name: input.name, hint, error, describedBy });
  const control = <input {...input} id={wiring.id} {...wiring.aria} className={CONTROL_CLASS} />;
  return (
    <FieldFrame
      label={label}
      hint={hint}
      labelHidden={labelHidden}
      wiring={wiring}
      required={input.required}
      className={className}
    >
      {unit ? (
        <span className="flex items-center gap-2">
          {control}
          <span id={unitId} className="shrink-0 text-ink-soft">
            {unit}
          </span>
        </span>
      ) : (
        control
      )}
    </FieldFrame>
  );
}
