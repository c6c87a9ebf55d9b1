import type { ReactNode } from "react";

interface ErrorPageProps {
  /** As text: "404". */
  status?: string;
  title: string;
  /** What happened, in this case. */
  detail?: string;
  /** What the person can do next. */
  next: string;
  actions?: ReactNode;
  /** The level of its title; a page of its own has "h1". */
  heading?: "h1" | "h2" | "h3";
  /** By which the log knows this answer; for telling an administrator. */
  reference?: string;
  /** Shown on the machine of whoever develops, never to others. */
  stack?: string;
}

export function ErrorPage({
  status,
  title,
  detail,
  next,
  actions,
  heading: Heading = "h1",
  reference,
  stack,
}: ErrorPageProps) {
  return (
    <div className="max-w-words py-10">
      {status ? <p className="label num">Answer {status}</p> : null}
      <Heading className="border-b border-ink pb-3 text-2xl font-medium tracking-[-0.01em] md:text-3xl">
        {title}
      </Heading>
      {detail ? <p className="mt-5 text-lg">{detail}</p> : null}
      <p className="mt-3 text-lg text-ink-soft">{next}</p>
      {reference ? (
        <p className="mt-3 text-ink-soft">
          The log knows it as <code className="num">{reference}</code>.
        </p>
      ) : null}
      {actions ? <div className="mt-6 flex flex-wrap gap-3">{actions}</div> : null}
      {stack ? <pre className="mt-10 overflow-x-auto border-t border-rule pt-3 text-xs">{stack}</pre> : null}
    </div>
  );
}
