import { type Regime, regimeOf } from "#app/astrometry/parallax.ts";
import type { NewMeasurement } from "#app/catalogue/measurement-input.ts";
import { toCanonical } from "#app/catalogue/quantities.ts";

/** What a page says after something was done; the address carries the word. */
export const SAID: Record<string, string> = {
  kept: "The record is kept.",
  measured: "The measurement is proposed. Nothing is adopted by that.",
  "measured-firm": "The parallax is proposed: firm, a value with its range may be shown. Nothing is adopted by that.",
  "measured-wide":
    "The parallax is proposed: wide, a range in numbers is all that may be shown. Nothing is adopted by that.",
  "measured-prior-led":
    "The parallax is kept as it was printed: prior-led. Nothing follows from one over it; a distance takes a named prior, with a reason, when it is adopted.",
  "measured-no-error":
    "The parallax is kept as it was printed. Without an error no range follows from it, so it cannot be adopted.",
  adopted: "The parallax is adopted.",
  confirmed: "The value is no longer from memory.",
  rejected: "The measurement is set aside.",
  vetted: "The record is vetted.",
  unvetted: "The record is a draft again.",
};

/** What may be said from a parallax, or that it has no error. */
export function regimeOfParallax(of: Pick<NewMeasurement, "value" | "error" | "unit">): Regime | "no-error" {
  if (of.error === null) return "no-error";
  const mas = (text: string) => toCanonical("parallax", text, of.unit);
  return regimeOf(mas(of.value), mas(of.error));
}

/** The word of SAID for a measurement that was just proposed. */
export function saidOfMeasurement(measured: NewMeasurement): string {
  return measured.quantity === "parallax" ? `measured-${regimeOfParallax(measured)}` : "measured";
}
