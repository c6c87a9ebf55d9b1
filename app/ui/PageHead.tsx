import { Fragment, type ReactNode } from "react";
import { Link } from "react-router";

export interface Crumb {
  label: string;
  to: string;
}

export interface PageHeadProps {
  title: string;
  /** The way back up, outermost first; the page itself is not among them. */
  crumbs?: readonly Crumb[];
  /** Beside the title, quieter: other designations, a revision. */
  subtitle?: ReactNode;
  /** A `StateMark`. */
  state?: ReactNode;
  actions?: ReactNode;
}

export function PageHead({ title, crumbs = [], subtitle, state, actions }: PageHeadProps) {
  return (
    <header className="mb-8 border-b border-ink pb-3">
      {crumbs.length > 0 ? (
        <nav aria-label="Where this is" className="mb-1 text-sm text-ink-soft">
          {crumbs.map((crumb, index) => (
            <Fragment key={crumb.to}>
              {index > 0 ? <span aria-hidden="true"> / </span> : null}
              <Link to={crumb.to} className="link">
                {crumb.label}
              </Link>
            </Fragment>
          ))}
        </nav>
      ) : null}
      <div className="flex flex-wrap items-baseline gap-x-5 gap-y-2">
        <h1 className="text-2xl font-medium tracking-[-0.01em] md:text-3xl">{title}</h1>
        {subtitle ? <p className="text-ink-soft">{subtitle}</p> : null}
        {state || actions ? (
          <div className="flex flex-wrap items-center gap-3 md:ml-auto">
            {state}
            {actions}
          </div>
        ) : null}
      </div>
    </header>
  );
}
