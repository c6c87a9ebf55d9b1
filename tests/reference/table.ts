import { readFileSync } from "node:fs";

export interface Table<Case> {
  script: string;
  versions: Record<string, string>;
  cases: Case[];
}

/** JSON has no number for an infinity; the scripts write the word. */
const infinities = (_: string, value: unknown) =>
  value === "Infinity" || value === "-Infinity" ? Number(value) : value;

/** A table as a script printed it. */
export function parseTable<Case>(text: string): Table<Case> {
  return JSON.parse(text, infinities);
}

/** A committed table, by the name of its script. */
export function readTable<Case>(name: string): Table<Case> {
  return parseTable(readFileSync(new URL(`./tables/${name}.json`, import.meta.url), "utf8"));
}
