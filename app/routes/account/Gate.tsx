import type { ReactNode } from "react";

/** The sheet on which everybody who is not signed in yet meets the house. */
export function Gate({ title, lead, children }: { title: string; lead?: ReactNode; children: ReactNode }) {
  return (
    <main id="main" tabIndex={-1} className="page grid min-h-dvh content-center justify-items-center py-10">
      <div className="w-full max-w-[26rem]">
        <p className="mb-10 font-head text-lg font-bold">Alidade</p>
        <h1 className="border-b border-ink pb-3 text-2xl">{title}</h1>
        {lead ? <div className="mt-3 text-ink-soft">{lead}</div> : null}
        <div className="mt-6">{children}</div>
      </div>
    </main>
  );
}
