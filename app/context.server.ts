import { createContext } from "react-router";
import type { Actor } from "./audit/actor.ts";

/** What the middlewares put on a request for the loaders and actions behind them. */
export const nonceContext = createContext<string>("");
export const requestIdContext = createContext<string>("");
/** Seconds until it makes sense to ask again; null: now. */
export const retryAfterContext = createContext<number | null>(null);
/** null: nobody is signed in. */
export const actorContext = createContext<Actor | null>(null);
