import type { ReactNode } from "react";
import { classes } from "./classes.ts";

export type NoticeTone = "info" | "success" | "warning" | "error";

const TONES: Record<NoticeTone, string> = {
  info: "border-edge bg-paper-shade",
  // Not verdigris: that a thing was saved does not make it vetted or live.
  success: "border-ink bg-paper-shade",
  warning: "border-vermilion bg-paper-shade",
  error: "border-vermilion bg-vermilion-wash",
};

interface NoticeProps {
  tone?: NoticeTone;
  title?: string;
  children?: ReactNode;
  className?: string;
}

/** Something to know before going on. An error interrupts a listener, the others wait their turn. */
export function Notice({ tone = "info", title, children, className }: NoticeProps) {
  return (
    <div
      role={tone === "error" ? "alert" : "status"}
      className={classes("mb-6 border-l-4 px-4 py-3", TONES[tone], className)}
    >
      {title ? <p className="font-head font-medium">{title}</p> : null}
      {children ? <div>{children}</div> : null}
    </div>
  );
}
