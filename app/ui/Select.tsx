import type { ComponentProps } from "react";
import { FieldFrame } from "./FieldFrame.tsx";
import { CONTROL_CLASS, type FieldWords, wireField } from "./field-wiring.ts";

export interface Option {
  value: string;
  label: string;
  disabled?: boolean;
}

export interface SelectProps extends Omit<ComponentProps<"select">, "className" | "children">, FieldWords {
  options: readonly Option[];
  /** An empty first choice, such as "Choose a source". */
  placeholder?: string;
  className?: string;
}

export function Select(props: SelectProps) {
  const { label, hint, error, labelHidden, options, placeholder, className, ...input } = props;
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
      <select {...input} id={wiring.id} {...wiring.aria} className={`${CONTROL_CLASS} pl-2`}>
        {placeholder === undefined ? null : <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.disabled}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
