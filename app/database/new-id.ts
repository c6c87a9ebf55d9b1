import { monotonicFactory } from "ulid";

/** A new row's id: a ULID, later ones sorting after earlier ones even within one millisecond of one process. */
export const newId = monotonicFactory();
