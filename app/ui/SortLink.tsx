import { Link, useLocation } from "react-router";

export interface Sort {
  column: string;
  direction: "ascending" | "descending";
}

interface SortLinkProps {
  id: string;
  sort: Sort | undefined;
  href: (columnId: string, direction: Sort["direction"]) => string;
  children: string;
}

/** A column's head as a link: first up, then down. */
export function SortLink({ id, sort, href, children }: SortLinkProps) {
  const current = sort?.column === id ? sort.direction : null;
  return (
    <Link
      to={href(id, current === "ascending" ? "descending" : "ascending")}
      preventScrollReset
      className="inline-flex items-baseline gap-1 underline decoration-edge underline-offset-4 hover:decoration-ink"
    >
      {children}
      <SortMark direction={current} />
    </Link>
  );
}

/** Drawn, not typed: the triangles of type are in neither of our faces. */
function SortMark({ direction }: { direction: Sort["direction"] | null }) {
  if (!direction) return null;
  return (
    <svg aria-hidden="true" viewBox="0 0 8 8" className="size-2 fill-current" data-mark>
      <path d={direction === "ascending" ? "M4 1 8 7H0Z" : "M4 7 0 1h8Z"} />
    </svg>
  );
}

/** This page with `sort` and `dir` in its query; a new order starts again at the first page. */
export function useSortHref() {
  const location = useLocation();
  return (columnId: string, direction: Sort["direction"]) => {
    const query = new URLSearchParams(location.search);
    query.set("sort", columnId);
    query.set("dir", direction === "ascending" ? "asc" : "desc");
    query.delete("page");
    return `${location.pathname}?${query}`;
  };
}
