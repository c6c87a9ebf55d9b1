import { useSyncExternalStore } from "react";

const never = () => () => {};

/** False on the server and in the first render of the browser, true after. */
export function useHydrated(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
