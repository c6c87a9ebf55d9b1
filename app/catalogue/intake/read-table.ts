import { Invalid } from "#app/errors.ts";
import { readCsv } from "./read-csv.ts";
import { readVotable } from "./read-votable.ts";
import type { Table } from "./table.ts";

/** Nothing that people read has these, whatever its encoding. */
// biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what is looked for
const CONTROL = /[\u0000-\u0008\u000e-\u001f]/;

function decode(bytes: Uint8Array): string {
  // Spreadsheets save "Unicode text" as UTF-16 with a mark in front.
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return new TextDecoder("utf-16le").decode(bytes);
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    // VizieR and older tools write Latin-1; whatever byte there is means something in it.
    return new TextDecoder("latin1").decode(bytes);
  }
}

/** Text or nothing: what has characters that no text has is no table. */
function textOf(bytes: Uint8Array): string {
  const text = decode(bytes);
  if (text.trim() === "") throw new Invalid({ file: ["This file is empty."] });
  if (CONTROL.test(text)) {
    throw new Invalid({ file: ["This is no text. Send a CSV file or a VOTable, not packed."] });
  }
  return text;
}

/** Reads a table, told apart by its content and not by its name. @throws Invalid at `file` */
export function readTable(bytes: Uint8Array): Table {
  const text = textOf(bytes);
  return /^\ufeff?\s*</.test(text.slice(0, 200)) ? readVotable(text) : readCsv(text);
}
