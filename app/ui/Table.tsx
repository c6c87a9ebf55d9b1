/* biome-ignore-all lint/a11y/noRedundantRoles: a stacked table would lose its meaning, see Table */
import type { ReactNode } from "react";
import { classes } from "./classes.ts";
import { type Sort, SortLink, useSortHref } from "./SortLink.tsx";

export interface Column<Row> {
  id: string;
  head: string;
  cell: (row: Row) => ReactNode;
  /** Right-aligned with tabular numerals. */
  numeric?: boolean;
  /** This cell names the row. Exactly one column should. */
  rowHead?: boolean;
  sortable?: boolean;
  /** The head is for listeners only (a column of buttons, of spread bars). */
  headHidden?: boolean;
  /** Extra classes for head and cells, such as a width or `max-lg:hidden`. */
  className?: string;
}

export interface TableProps<Row> {
  caption: string;
  captionHidden?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  sort?: Sort;
  /** Where a head leads; by default this page with `sort` and `dir` in its query and no `page`. */
  sortHref?: (columnId: string, direction: Sort["direction"]) => string;
  /** Shown instead of the table when there are no rows. */
  empty?: ReactNode;
  rowClassName?: (row: Row) => string | undefined;
  className?: string;
}

/**
 * On a phone each row becomes a small sheet of its own with the column's head before each value. Changing `display` takes
 * the meaning of a table away from some browsers' accessibility trees, so the roles are written out.
 */
export function Table<Row>(props: TableProps<Row>) {
  const { columns, rows, sort } = props;
  const ownHref = useSortHref();
  if (rows.length === 0 && props.empty) return props.empty;
  return (
    <table role="table" className={classes("w-full border-collapse text-base max-md:block", props.className)}>
      <caption
        className={props.captionHidden ? "sr-only" : "pb-2 text-left font-head text-lg font-medium max-md:block"}
      >
        {props.caption}
      </caption>
      <thead role="rowgroup" className="max-md:sr-only md:sticky md:top-0 md:z-10 md:bg-paper print:static">
        <tr role="row" className="border-b border-ink">
          {columns.map((column) => (
            <th
              key={column.id}
              role="columnheader"
              scope="col"
              aria-sort={sort?.column === column.id ? sort.direction : undefined}
              className={classes("label px-2 py-2 first:pl-0 last:pr-0", alignment(column), column.className)}
            >
              {column.sortable ? (
                <SortLink id={column.id} sort={sort} href={props.sortHref ?? ownHref}>
                  {column.head}
                </SortLink>
              ) : (
                <span className={column.headHidden ? "sr-only" : undefined}>{column.head}</span>
              )}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="max-md:block">
        {rows.map((row) => (
          <tr
            key={props.rowKey(row)}
            role="row"
            className={classes("border-b border-rule align-top max-md:block max-md:py-2", props.rowClassName?.(row))}
          >
            {columns.map((column) => (
              <Cell key={column.id} column={column} row={row} />
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Cell<Row>({ column, row }: { column: Column<Row>; row: Row }) {
  const content = column.cell(row);
  const look = classes(
    "px-2 py-2.5 first:pl-0 last:pr-0 max-md:flex max-md:justify-between max-md:gap-4 max-md:px-0 max-md:py-1",
    "max-md:empty:hidden",
    alignment(column),
    column.className,
  );
  if (column.rowHead) {
    return (
      <th role="rowheader" scope="row" className={classes("font-semibold", look)}>
        {content}
      </th>
    );
  }
  return (
    <td role="cell" className={look}>
      <span aria-hidden="true" className={column.headHidden ? "hidden" : "label shrink-0 md:hidden"}>
        {column.head}
      </span>
      <div className={column.headHidden ? "max-md:grow" : "max-md:text-right"}>{content}</div>
    </td>
  );
}

function alignment<Row>(column: Column<Row>): string {
  return column.numeric ? "num text-right max-md:text-left" : "text-left";
}
