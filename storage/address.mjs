import { badPort } from "./messages.mjs";
import { Refusal } from "./refusal.mjs";

export const DEFAULT_PORT = 4310;

/**
 * Where the application listens, and the address that people use.
 * @param {Record<string, string | undefined>} environment
 */
export function readAddress(environment) {
  const text = environment.PORT || String(DEFAULT_PORT);
  const port = Number(text);
  if (!/^\d{1,5}$/.test(text) || port < 1 || port > 65_535) throw new Refusal(badPort(text));
  const host = environment.HOST || "127.0.0.1";
  const shown = host === "0.0.0.0" || host === "::" || host === "127.0.0.1" ? "127.0.0.1" : host;
  const url = environment.PUBLIC_URL || `http://${shown.includes(":") ? `[${shown}]` : shown}:${port}`;
  return { host, port, url };
}
