import type { ReactNode } from "react";
import { classes } from "./classes.ts";

export interface Definition {
  term: string;
  value: ReactNode;
  /** A second, quieter line: the source, the text as printed. */
  note?: ReactNode;
}

interface DefinitionListProps {
  items: readonly Definition[];
  /** Values at the right edge, as sums on a slip. */
  ledger?: boolean;
  className?: string;
}

export function DefinitionList({ items, ledger, className }: DefinitionListProps) {
  return (
    <dl className={className}>
      {items.map((item) => (
        <div
          key={item.term}
          className={classes(
            "grid gap-x-4 border-b border-rule py-2",
            ledger ? "grid-cols-[1fr_auto]" : "sm:grid-cols-[minmax(8rem,1fr)_2fr]",
          )}
        >
          <dt className={ledger ? undefined : "text-ink-soft"}>{item.term}</dt>
          <dd className={classes("num min-w-0", ledger && "text-right")}>
            {item.value}
            {item.note ? <div className="text-sm text-ink-soft">{item.note}</div> : null}
          </dd>
        </div>
      ))}
    </dl>
  );
}
