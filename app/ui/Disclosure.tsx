import type { ReactNode } from "react";
import { classes } from "./classes.ts";

interface DisclosureProps {
  summary: ReactNode;
  open?: boolean;
  children: ReactNode;
  className?: string;
}

/** Unfolds what most people need not see. */
export function Disclosure({ summary, open, children, className }: DisclosureProps) {
  return (
    <details open={open} className={classes("group border-b border-rule", className)}>
      <summary className="tap flex list-none items-center gap-3 font-head text-sm font-medium">
        <svg aria-hidden="true" viewBox="0 0 10 10" className="size-2.5 shrink-0 fill-none stroke-current stroke-2">
          <path d="M0 5h10" />
          <path d="M5 0v10" className="group-open:hidden" />
        </svg>
        {summary}
      </summary>
      <div className="pb-4">{children}</div>
    </details>
  );
}
