import type { ReactNode } from "react";
import { classes } from "./classes.ts";

interface BigNumberProps {
  label: string;
  /** Already in words; "25.04", or "480 to 640" when only a range may be shown. */
  value: string;
  unit?: string;
  /** The range in words, under the number, in the colour of uncertainty. */
  range?: string;
  /** "range" is for two numbers in one line. */
  size?: "large" | "range" | "medium";
  /** Usually a `SpreadBar`. */
  children?: ReactNode;
}

const SIZES = {
  large: "text-4xl forced-colors:leading-[1.3] md:text-5xl",
  range: "text-3xl",
  medium: "text-2xl tracking-[-0.02em]",
};

/** A number set larger than its label. It stands alone, so its numerals are proportional: the face's tabular 1 is all foot. */
export function BigNumber({ label, value, unit, range, size = "large", children }: BigNumberProps) {
  return (
    <div>
      <p className="label">{label}</p>
      <p className="flex flex-wrap items-baseline gap-x-2 font-head">
        <span className={classes("font-medium tracking-[-0.03em]", SIZES[size])}>{value}</span>
        {unit ? (
          <span className={classes("text-ink-soft", size === "medium" ? "text-lg" : "text-xl")}>{unit}</span>
        ) : null}
      </p>
      {range ? (
        <p className={classes("font-head text-vermilion", size === "medium" ? "text-base" : "text-lg")}>{range}</p>
      ) : null}
      {children ? <div className="mt-3">{children}</div> : null}
    </div>
  );
}
