import { Invalid } from "#app/errors.ts";
import { readCsv } from "./read-csv.ts";
import { readVotable } from "./read-votable.ts";
import type { Table } from "./table.ts";

/** Text or nothing: what is not UTF-8, or has bytes that no text has, is no table. */
function textOf(bytes: Uint8Array): string {
  if (bytes.subarray(0, 65_536).includes(0)) {
    throw new Invalid({ file: ["This is no text. Send a CSV file or a VOTable, not packed."] });
  }
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    // VizieR and older tools write Latin-1; whatever byte there is means something in it.
    return new TextDecoder("latin1").decode(bytes);
  }
}

/** Reads a table, told apart by its content and not by its name. @throws Invalid at `file` */
export function readTable(bytes: Uint8Array): Table {
  const text = textOf(bytes);
  return /^\ufeff?\s*</.test(text.slice(0, 200)) ? readVotable(text) : readCsv(text);
}
