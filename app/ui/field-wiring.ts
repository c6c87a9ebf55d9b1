export type FieldError = string | readonly string[] | null | undefined;

export interface FieldWords {
  label: string;
  /** One sentence on what is wanted and in which form. */
  hint?: string;
  error?: FieldError;
  /** Set the label for listeners only, where the place makes it plain to the eye. */
  labelHidden?: boolean;
}

export interface Wiring {
  id: string;
  hintId: string | undefined;
  errorId: string | undefined;
  messages: string[];
  /** To spread on the control: who describes it, and whether it is wrong. */
  aria: { "aria-describedby": string | undefined; "aria-invalid": true | undefined };
}

export function messagesOf(error: FieldError): string[] {
  if (!error) return [];
  return typeof error === "string" ? [error] : [...error];
}

/**
 * Ids and aria attributes that tie a control to its hint and its errors. The id is the field's name unless one is given,
 * so that `FormErrors` can link to it; the error's id is the one that conform expects (`<id>-error`).
 */
export function wireField(input: {
  id?: string;
  name?: string;
  hint?: string;
  error?: FieldError;
  describedBy?: string;
}): Wiring {
  const id = input.id ?? input.name ?? "";
  const messages = messagesOf(input.error);
  const hintId = input.hint ? `${id}-hint` : undefined;
  const errorId = messages.length > 0 ? `${id}-error` : undefined;
  const describers = [...(input.describedBy?.split(" ") ?? []), hintId, errorId].filter((one) => one !== undefined);
  return {
    id,
    hintId,
    errorId,
    messages,
    aria: {
      "aria-describedby": [...new Set(describers)].join(" ") || undefined,
      "aria-invalid": messages.length > 0 ? true : undefined,
    },
  };
}

export const CONTROL_CLASS =
  "tap w-full border border-edge bg-sheet px-3 py-1.5 text-base text-ink hover:border-ink " +
  "aria-invalid:border-2 aria-invalid:border-vermilion disabled:bg-paper-shade disabled:text-ink-soft " +
  "[&[readonly]]:bg-paper-shade file:mr-3 file:border-0 file:border-r file:border-edge file:bg-transparent file:pr-3 " +
  "file:font-head file:text-sm file:font-medium";
