import { createContext } from "react";

/**
 * The nonce of this answer, for scripts and styles that a page writes itself. Given by entry.server.tsx; empty in the
 * browser, which hides nonces from scripts and reports an empty one, so that both sides agree.
 */
export const NonceContext = createContext("");
