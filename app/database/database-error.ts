/** MariaDB's error numbers that the program answers by name. */
export const DUPLICATE_ENTRY = 1062;
export const DEADLOCK = 1213;
export const LOCK_WAIT_TIMEOUT = 1205;
/** With innodb_snapshot_isolation=ON: the row changed after this transaction began to read. */
export const CHANGED_SINCE_READ = 1020;

interface DriverError {
  errno?: number;
  sqlMessage?: string;
  cause?: unknown;
}

/** The driver's error number, looked up through Drizzle's wrapping. */
export function errorNumber(error: unknown): number | undefined {
  for (let at = error as DriverError | undefined; at; at = at.cause as DriverError | undefined) {
    if (typeof at.errno === "number") return at.errno;
  }
  return undefined;
}

/** The name of the unique key that a 1062 speaks of, such as "source_bibcode". */
export function duplicateKey(error: unknown): string | undefined {
  if (errorNumber(error) !== DUPLICATE_ENTRY) return undefined;
  for (let at = error as DriverError | undefined; at; at = at.cause as DriverError | undefined) {
    const key = at.sqlMessage?.match(/for key '(?:.*\.)?([^']+)'/)?.[1];
    if (key) return key;
  }
  return undefined;
}

const AWAY = new Set(["ECONNREFUSED", "ECONNRESET", "ETIMEDOUT", "EPIPE"]);

/** true where a service could not be reached at all, so that trying again later makes sense. */
export function isConnectionError(error: unknown): boolean {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    if ("code" in at && typeof at.code === "string" && "syscall" in at && AWAY.has(at.code)) return true;
    if ("code" in at && at.code === "PROTOCOL_CONNECTION_LOST") return true;
  }
  return false;
}
