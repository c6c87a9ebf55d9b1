import { SaxesParser } from "saxes";
import { Invalid } from "#app/errors.ts";
import { MOST_CELL, MOST_COLUMNS, MOST_ROWS, type Table, type TableColumn, type TableRow } from "./table.ts";

const MOST_DEPTH = 40;
const DOCTYPE = /^(?:\s|<\?[^>]*>|<!--[\s\S]*?-->)*<!DOCTYPE/i;
const NO_DOCTYPE = "This XML has a DOCTYPE, which a table does not need. It is not read.";

function refuse(message: string): never {
  throw new Invalid({ file: [message] });
}

/**
 * Reads the first table of an IVOA VOTable in TABLEDATA. Anything that could reach outside the file or swell inside it
 * (a DOCTYPE, entities of its own, runaway depth or cells) is refused at first sight.
 * @throws Invalid at `file`
 */
export function readVotable(text: string): Table {
  // The parser tells of a DOCTYPE once it has read all of it; one that stands where it should is refused before.
  if (DOCTYPE.test(text.slice(0, 4096))) refuse(NO_DOCTYPE);
  const reader = new TableReader();
  const parser = new SaxesParser({ position: true });
  parser.on("doctype", () => refuse(NO_DOCTYPE));
  parser.on("opentag", (tag) => reader.open(tag.name, tag.attributes as Record<string, string>));
  parser.on("closetag", (tag) => reader.close(tag.name));
  parser.on("text", (chunk) => reader.text(chunk));
  parser.on("cdata", (chunk) => reader.text(chunk));
  parser.on("error", (error) => refuse(`This XML is broken: ${error.message.split("\n")[0]}`));
  parser.write(text).close();
  return reader.table();
}

/** Local name: a VOTable may carry a namespace prefix. */
const local = (name: string) => name.slice(name.indexOf(":") + 1).toUpperCase();

class TableReader {
  private columns: TableColumn[] = [];
  /** What stands in a column for nothing (VALUES null="..."), by its place. */
  private blanks = new Map<number, string>();
  private rows: TableRow[] = [];
  private cells: string[] | null = null;
  private cell: string | null = null;
  private depth = 0;
  private done = false;
  private seen = false;

  open(name: string, attributes: Record<string, string>): void {
    this.depth += 1;
    if (this.depth > MOST_DEPTH) refuse("This XML is nested deeper than any table.");
    const tag = local(name);
    if (this.depth === 1 && tag !== "VOTABLE") refuse("This XML is no VOTable.");
    if (this.done) return;
    if (tag === "FIELD") this.field(attributes);
    if (tag === "VALUES" && attributes.null) this.blanks.set(this.columns.length - 1, attributes.null.trim());
    if (tag === "BINARY" || tag === "BINARY2" || tag === "FITS") {
      refuse(`This VOTable is written as ${tag}. Only TABLEDATA is read here: save it so and send it again.`);
    }
    if (tag === "TR") this.cells = [];
    if (tag === "TD") this.cell = "";
  }

  text(chunk: string): void {
    if (this.cell === null) return;
    this.cell += chunk;
    if (this.cell.length > MOST_CELL) refuse(`A cell is longer than ${MOST_CELL} characters.`);
  }

  close(name: string): void {
    this.depth -= 1;
    const tag = local(name);
    if (tag === "TABLE" && this.seen) this.done = true;
    if (this.done) return;
    if (tag === "TD" && this.cell !== null) {
      const text = this.cell.trim();
      if (this.cells) this.cells.push(this.blanks.get(this.cells.length) === text ? "" : text);
      this.cell = null;
    }
    if (tag === "TR" && this.cells) {
      this.rows.push({ number: this.rows.length + 1, cells: this.cells });
      this.cells = null;
      if (this.rows.length > MOST_ROWS)
        refuse(`More than ${MOST_ROWS} rows. Part the file and send it piece by piece.`);
    }
  }

  private field({ name, ID, unit, ucd }: Record<string, string>): void {
    this.seen = true;
    this.columns.push({
      name: name || ID || `column ${this.columns.length + 1}`,
      unit: unit || null,
      ucd: ucd || null,
    });
    if (this.columns.length > MOST_COLUMNS) refuse(`More than ${MOST_COLUMNS} columns.`);
  }

  table(): Table {
    if (this.columns.length === 0) refuse("There is no table with fields in this VOTable.");
    if (this.rows.length === 0) refuse("The table of this VOTable has no row.");
    return { format: "votable", columns: this.columns, rows: this.rows };
  }
}
