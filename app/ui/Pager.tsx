import { Link } from "react-router";

interface PagerProps {
  /** Where a page has several of them: what this one turns the pages of. */
  label?: string;
  /** "51 to 100 of 1,204", already in words. */
  summary: string;
  /** Addresses of the neighbours; none at an end. */
  previous?: string | null;
  next?: string | null;
}

export function Pager({ label = "Pages", summary, previous, next }: PagerProps) {
  return (
    <nav aria-label={label} className="mt-4 flex flex-wrap items-center gap-x-6 gap-y-1 text-sm">
      <span className="num text-ink-soft">{summary}</span>
      <PagerLink to={previous} rel="prev">
        Previous
      </PagerLink>
      <PagerLink to={next} rel="next">
        Next
      </PagerLink>
    </nav>
  );
}

function PagerLink({ to, rel, children }: { to: string | null | undefined; rel: string; children: string }) {
  const look = "tap inline-flex items-center font-head font-medium";
  if (!to) return <span className={`${look} text-ink-soft no-underline`}>{children}</span>;
  return (
    <Link to={to} rel={rel} className={`${look} link`}>
      {children}
    </Link>
  );
}
