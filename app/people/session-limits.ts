const HOUR = 3_600_000;

/** A session that nobody used for this long has ended. */
export const IDLE_MS = 8 * HOUR;
/** However much it is used, a session ends this long after sign-in. */
export const ABSOLUTE_MS = 7 * 24 * HOUR;
/** Being seen is written down at most this often. */
export const SEEN_EVERY_MS = 60_000;
