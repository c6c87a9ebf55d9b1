import { classes } from "./classes.ts";
import { FieldHint, FieldMessages, RequiredWord } from "./FieldFrame.tsx";
import { type FieldWords, wireField } from "./field-wiring.ts";
import type { Option } from "./Select.tsx";

export interface RadioGroupProps extends FieldWords {
  name: string;
  id?: string;
  form?: string;
  options: readonly (Option & { hint?: string })[];
  defaultValue?: string;
  required?: boolean;
  /** Side by side instead of one under the other. */
  inline?: boolean;
  className?: string;
}

export function RadioGroup(props: RadioGroupProps) {
  const { label, hint, error, labelHidden, name, options, defaultValue, required, inline, className } = props;
  const wiring = wireField({ id: props.id, name, hint, error });
  return (
    <fieldset
      id={wiring.id}
      tabIndex={-1}
      className={classes("grid gap-1", className)}
      aria-describedby={wiring.aria["aria-describedby"]}
    >
      <legend className={labelHidden ? "sr-only" : "font-head text-sm font-medium"}>
        {label}
        {required ? <RequiredWord /> : null}
      </legend>
      {hint ? <FieldHint id={wiring.hintId}>{hint}</FieldHint> : null}
      <div className={inline ? "flex flex-wrap gap-x-6" : "grid"}>
        {options.map((option) => {
          const optionId = `${wiring.id}-${option.value}`;
          const optionHintId = option.hint ? `${optionId}-hint` : undefined;
          return (
            <div key={option.value} className="grid grid-cols-[1.25rem_1fr] items-center gap-x-3">
              <input
                type="radio"
                id={optionId}
                name={name}
                form={props.form}
                value={option.value}
                defaultChecked={option.value === defaultValue}
                disabled={option.disabled}
                required={required}
                aria-invalid={wiring.aria["aria-invalid"]}
                aria-describedby={optionHintId}
                className="size-5"
              />
              <label htmlFor={optionId} className="tap flex items-center py-1">
                {option.label}
              </label>
              {option.hint ? (
                <p id={optionHintId} className="col-start-2 pb-2 text-sm text-ink-soft">
                  {option.hint}
                </p>
              ) : null}
            </div>
          );
        })}
      </div>
      <FieldMessages wiring={wiring} />
    </fieldset>
  );
}
