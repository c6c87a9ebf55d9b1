import { type RefObject, useRef } from "react";
import { useNavigation } from "react-router";

interface Pending<E extends HTMLElement> {
  ref: RefObject<E | null>;
  /** Something is being sent, by this form or another. */
  busy: boolean;
  /** It is this button's form, and this button, that is being sent. */
  mine: boolean;
}

/** Tells a submit button whether its form is on its way. `name` and `value` set it apart from others in the form. */
export function usePending(name?: string, value?: string): Pending<HTMLButtonElement> {
  const ref = useRef<HTMLButtonElement>(null);
  const navigation = useNavigation();
  const busy = navigation.formMethod !== undefined && navigation.formMethod !== "GET";
  if (!busy) return { ref, busy, mine: false };
  const action = ref.current?.form?.getAttribute("action");
  const sameForm = !action || pathOf(action) === pathOf(navigation.formAction ?? "");
  const sameButton = !name || !value || navigation.formData?.get(name) === value;
  return { ref, busy, mine: sameForm && sameButton };
}

function pathOf(address: string): string {
  return new URL(address, "http://here.invalid").pathname;
}
