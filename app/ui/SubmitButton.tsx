import type { MouseEvent } from "react";
import type { ButtonProps } from "./Button.tsx";
import { buttonClass } from "./button-look.ts";
import { usePending } from "./use-pending.ts";

export interface SubmitButtonProps extends Omit<ButtonProps, "type" | "value"> {
  /** Sent as `intent` where a form has several buttons. */
  intent?: string;
  value?: string;
  /** What the button says while its form is on its way. */
  pending?: string;
  /** For a form sent by a fetcher, which the page's navigation does not know about. */
  busy?: boolean;
}

/**
 * Sends its form. While anything is being sent it takes no second press; it stays focusable, so that a person who
 * listens hears "Saving…" instead of losing their place. Without JavaScript it is a plain submit button.
 */
export function SubmitButton(props: SubmitButtonProps) {
  const { intent, look = "primary", pending = "Saving…", busy, className, children, onClick, ...rest } = props;
  const name = rest.name ?? (intent ? "intent" : undefined);
  const value = rest.value ?? intent;
  const state = usePending(name, value);
  const waiting = state.busy || busy === true;
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (waiting) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <button
      {...rest}
      ref={state.ref}
      type="submit"
      name={name}
      value={value}
      aria-disabled={waiting || undefined}
      onClick={press}
      className={buttonClass(look, className)}
    >
      <span aria-live="polite">{state.mine || busy ? pending : children}</span>
    </button>
  );
}
