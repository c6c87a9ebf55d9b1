import { parse } from "csv-parse/sync";
import { Invalid } from "#app/errors.ts";
import { MOST_CELL, MOST_COLUMNS, MOST_ROWS, type Table, type TableColumn } from "./table.ts";

const DELIMITERS = [",", ";", "\t"];
/** Units that tell a line of units under the head from a row, as archives print them. */
const UNIT = /^"?(deg|[mu]?as|[mu]?as[./]yr(-1|\*\*-1)?|arcsec|mag|km[./]s(-1|\*\*-1)?|h:m:s|d:m:s)"?$/i;
/** Rows of another width that are read before a file that has mostly such is given up. */
const RAGGED = 200;

function refuse(message: string): never {
  throw new Invalid({ file: [message] });
}

/** No number stands in a line of units, and at least one unit that is known. */
const isUnits = (line: string[]) =>
  line.some((cell) => UNIT.test(cell)) && line.every((cell) => cell === "" || Number.isNaN(Number(cell)));

/** The delimiter that parts the head into the most columns. */
function delimiterOf(head: string): string {
  const count = (delimiter: string) => head.split(delimiter).length;
  return DELIMITERS.reduce((best, one) => (count(one) > count(best) ? one : best));
}

/**
 * Reads comma-, semicolon- or tab-separated text: comment lines (#), a byte-order mark, and a line of units under the head
 * as the archives write them. Rows of another width than the head are kept as they are; the dry run reports them.
 * @throws Invalid at `file`
 */
export function readCsv(text: string): Table {
  const head = text.split(/\r?\n/).find((line) => line.trim() !== "" && !line.startsWith("#")) ?? "";
  if (head.length > 100_000) refuse("The first line is longer than any head of a table. This does not look like CSV.");
  const delimiter = delimiterOf(head);
  const lines = linesOf(text, delimiter);
  const [names, ...rest] = lines;
  if (!names || names.length < 2) refuse("A table has at least two columns, parted by commas, semicolons or tabs.");
  if (names.length > MOST_COLUMNS)
    refuse(`More than ${MOST_COLUMNS} columns. This does not look like a table of records.`);
  if (names.some((name) => name === "" || name.length > 200)) refuse("The first line does not name every column.");
  if (new Set(names).size !== names.length) refuse("Two columns have the same name.");
  const hasUnits = isUnits(rest[0] ?? []);
  const units = hasUnits ? rest[0] : undefined;
  const rulers = (line: string[]) => line.every((cell) => /^-+$/.test(cell));
  const data = rest.slice(hasUnits ? 1 : 0).filter((line) => !rulers(line));
  if (data.length === 0) refuse("There is a head, but no row under it.");
  if (data.length > MOST_ROWS) refuse(`More than ${MOST_ROWS} rows. Part the file and send it piece by piece.`);
  const columns = names.map(
    (name, at): TableColumn => ({ name, unit: units?.[at]?.replace(/"/g, "") || null, ucd: null }),
  );
  return { format: "csv", columns, rows: data.map((cells, at) => ({ number: at + 1, cells })) };
}

function linesOf(text: string, delimiter: string): string[][] {
  let [width, read, ragged] = [0, 0, 0];
  const look = (line: string[]) => {
    width ||= line.length;
    read += 1;
    if (line.length !== width) ragged += 1;
    if (ragged > RAGGED && ragged * 2 > read) {
      throw new Error(`most rows do not have the ${width} columns of the first line`);
    }
    return line;
  };
  try {
    return parse(text, {
      delimiter,
      comment: "#",
      comment_no_infix: true,
      relax_column_count: true,
      // Tab-separated archives print seconds of arc with bare quotation marks.
      relax_quotes: delimiter === "\t",
      skip_empty_lines: true,
      trim: true,
      max_record_size: MOST_COLUMNS * MOST_CELL,
      to: MOST_ROWS + 3,
      on_record: look,
    });
  } catch (error) {
    return refuse(`This cannot be read as CSV: ${told(error)}.`);
  }
}

/** The parser's own words may carry the whole cell: a sentence's worth is enough. */
function told(error: unknown): string {
  const words = error instanceof Error ? error.message : String(error);
  return words.length > 200 ? `${words.slice(0, 200)}…` : words;
}
