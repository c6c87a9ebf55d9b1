import type { ReactNode } from "react";

/** What the refused form of the book answered, if it was sent. */
export interface ChapterProps {
  errors: Record<string, string[]> | undefined;
}

export function Pattern({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mb-12 min-w-0">
      <h2 className="mb-3">{title}</h2>
      {children}
    </section>
  );
}
