import type { ReactNode } from "react";
import { classes } from "./classes.ts";

interface BigNumberProps {
  label: string;
  /** Already in words; "25.04", or "480 to 640" when only a range may be shown. */
  value: string;
  unit?: string;
  /** The range in words, under the number, in the colour of uncertainty. */
  range?: string;
  size?: "large" | "medium";
  /** Usually a `SpreadBar`. */
  children?: ReactNode;
}

/** A number set larger than its label. It stands alone, so its numerals are proportional: the face's tabular 1 is all foot. */
export function BigNumber({ label, value, unit, range, size = "large", children }: BigNumberProps) {
  return (
    <div>
      <p className="label">{label}</p>
      <p className="flex flex-wrap items-baseline gap-x-2 font-head">
        <span
          className={classes(
            "font-medium tracking-[-0.03em]",
            size === "large" ? "text-4xl forced-colors:leading-[1.3] md:text-5xl" : "text-2xl tracking-[-0.02em]",
          )}
        >
          {value}
        </span>
        {unit ? (
          <span className={classes("text-ink-soft", size === "large" ? "text-xl" : "text-lg")}>{unit}</span>
        ) : null}
      </p>
      {range ? (
        <p className={classes("font-head text-vermilion", size === "large" ? "text-lg" : "text-base")}>{range}</p>
      ) : null}
      {children ? <div className="mt-3">{children}</div> : null}
    </div>
  );
}
