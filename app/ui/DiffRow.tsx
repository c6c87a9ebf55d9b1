import type { ReactNode } from "react";

interface DiffRowProps {
  /** What changed. */
  label: string;
  /** null: there was nothing before, or there is nothing now. */
  before: ReactNode | null;
  after: ReactNode | null;
  /** A `StateMark`: "reads the same", "reads differently". */
  verdict?: ReactNode;
}

/** One thing that changed: before, then now. */
export function DiffRow({ label, before, after, verdict }: DiffRowProps) {
  return (
    <div className="grid gap-x-4 gap-y-1 border-b border-rule py-2 md:grid-cols-[minmax(8rem,1fr)_2fr_2fr_9rem]">
      <p className="label self-center">{label}</p>
      <p className="num text-ink-soft">
        <span className="label mr-2">before</span>
        {before === null ? "nothing" : <del className="decoration-edge">{before}</del>}
      </p>
      <p className="num">
        <span className="label mr-2">now</span>
        {after === null ? "nothing" : <ins className="bg-paper-shade px-0.5 font-semibold no-underline">{after}</ins>}
      </p>
      {verdict ? <p className="self-center md:text-right">{verdict}</p> : null}
    </div>
  );
}
