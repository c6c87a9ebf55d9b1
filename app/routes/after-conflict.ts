import type { ShouldRevalidateFunctionArgs } from "react-router";

/**
 * A page's `shouldRevalidate`: after a conflict it is read again, so that it shows what others saved and its form goes
 * against that version. By itself the router reads nothing again after a refused form.
 */
export function readAgainAfterConflict({ actionStatus, defaultShouldRevalidate }: ShouldRevalidateFunctionArgs) {
  return defaultShouldRevalidate || actionStatus === 409;
}
