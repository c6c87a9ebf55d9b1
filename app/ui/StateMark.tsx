import type { ReactNode } from "react";
import { classes } from "./classes.ts";

/** Each colour means one thing. "none" is a state that asks for nothing and promises nothing: draft, withdrawn. */
export type StateTone = "vetted" | "live" | "sealed" | "person" | "none";

const TONES: Record<StateTone, string> = {
  vetted: "border-verdigris text-verdigris",
  live: "border-verdigris text-verdigris",
  sealed: "border-brass text-brass",
  person: "border-vermilion text-vermilion",
  none: "border-transparent text-ink-soft forced-colors:border-[Canvas]",
};

interface StateMarkProps {
  tone: StateTone;
  /** The state in a word or two: colour alone says nothing. */
  children: ReactNode;
  /** With a square before it, for the head of a page. */
  large?: boolean;
}

export function StateMark({ tone, children, large }: StateMarkProps) {
  if (large) {
    return (
      <span className={classes("inline-flex items-center gap-2 font-head text-base font-medium", TONES[tone])}>
        <span aria-hidden="true" data-mark className="size-2 bg-current forced-colors:bg-[CanvasText]" />
        {children}
      </span>
    );
  }
  return <span className={classes("border-b-2 pb-px font-head text-xs", TONES[tone])}>{children}</span>;
}
