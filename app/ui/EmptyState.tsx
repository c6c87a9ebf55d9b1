import type { ReactNode } from "react";

interface EmptyStateProps {
  title: string;
  /** Why there is nothing, and what would bring something. */
  children?: ReactNode;
  actions?: ReactNode;
}

export function EmptyState({ title, children, actions }: EmptyStateProps) {
  return (
    <div className="max-w-words border-l border-rule py-4 pl-6">
      <p className="font-head text-lg font-medium">{title}</p>
      {children ? <div className="mt-1 text-ink-soft">{children}</div> : null}
      {actions ? <div className="mt-4 flex flex-wrap gap-3">{actions}</div> : null}
    </div>
  );
}
