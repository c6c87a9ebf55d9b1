import { classes } from "./classes.ts";

export type ButtonLook = "primary" | "quiet" | "danger" | "plain";

const LOOKS: Record<ButtonLook, string> = {
  primary: "border-ink bg-ink px-4 text-paper hover:bg-paper hover:text-ink",
  quiet: "border-ink px-4 text-ink hover:bg-ink hover:text-paper",
  danger: "border-vermilion px-4 text-vermilion hover:bg-vermilion hover:text-paper",
  plain: "min-w-6 border-transparent px-1 text-ink underline decoration-edge underline-offset-4 hover:decoration-ink",
};

export function buttonClass(look: ButtonLook = "quiet", more?: string): string {
  return classes(
    "tap inline-flex items-center justify-center gap-2 border py-1.5 text-center font-head text-sm font-medium",
    "aria-disabled:cursor-default aria-disabled:opacity-60 disabled:cursor-default disabled:opacity-60 print:hidden",
    LOOKS[look],
    more,
  );
}
