import { useEffect, useRef } from "react";
import { Link } from "react-router";
import { type FieldError, messagesOf } from "./field-wiring.ts";

export interface FormErrorsProps {
  /** By field name, as a verb's `Invalid` carries them; "" is the form as a whole. */
  errors: Readonly<Record<string, FieldError>> | null | undefined;
  /** The id of a field's control; its name unless said otherwise. */
  idFor?: (name: string) => string;
  title?: string;
  /** Pages that help to mend it. */
  links?: readonly { to: string; label: string }[];
}

/** What is wrong with a form, above it: each line leads to its field. Takes the focus when new errors arrive. */
export function FormErrors({ errors, idFor = (name) => name, title, links = [] }: FormErrorsProps) {
  const box = useRef<HTMLDivElement>(null);
  const lines = Object.entries(errors ?? {}).flatMap(([name, error]) =>
    messagesOf(error).map((message) => ({ name, message })),
  );
  // biome-ignore lint/correctness/useExhaustiveDependencies: a new answer with the same errors must take the focus again
  useEffect(() => {
    box.current?.focus();
  }, [errors]);
  if (lines.length === 0) return null;
  return (
    <div ref={box} role="alert" tabIndex={-1} className="mb-6 border-l-4 border-vermilion bg-vermilion-wash px-4 py-3">
      <p className="font-head font-medium">{title ?? headline(lines.length)}</p>
      <ul className="mt-1 grid gap-1 text-sm">
        {lines.map(({ name, message }) => (
          <li key={`${name} ${message}`}>
            {name === "" ? (
              message
            ) : (
              <a href={`#${idFor(name)}`} className="underline">
                {message}
              </a>
            )}
          </li>
        ))}
        {links.map(({ to, label }) => (
          <li key={to}>
            <Link to={to} className="underline">
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </div>
  );
}

function headline(count: number): string {
  return count === 1 ? "One thing needs attention" : `${count} things need attention`;
}
