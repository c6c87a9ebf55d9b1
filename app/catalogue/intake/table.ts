/** A table as it came, before anything in it was understood. */
export interface TableColumn {
  name: string;
  unit: string | null;
  ucd: string | null;
}

export interface TableRow {
  /** Its number among the data rows, from 1. */
  number: number;
  cells: string[];
}

export interface Table {
  format: "csv" | "votable";
  columns: TableColumn[];
  rows: TableRow[];
}

/** Limits that no table of records comes near. */
export const MOST_COLUMNS = 400;
export const MOST_CELL = 4000;
/** All rows are written in one transaction: half a minute of it is enough. */
export const MOST_ROWS = 50_000;
