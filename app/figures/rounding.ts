import { type Decimal, formatDecimal, parseDecimal, roundToScale, significantLength } from "./decimal.ts";

/** "pdg": Review of Particle Physics, section 5.3. "gum": JCGM 100:2008, 7.2.6 (at most two digits). */
export type RoundingRule = "pdg" | "gum";

/**
 * The place to which an uncertainty is rounded, as a scale (2: hundredths, -1: tens).
 * PDG: of its three leading digits (after rounding to three), 100-354 keep two, 355-949 keep one, 950-999 become 1000 and
 * keep two. GUM: two digits, after the carry.
 * @throws RangeError when the uncertainty is not above zero
 */
export function placeOfUncertainty(uncertainty: Decimal, rule: RoundingRule = "pdg"): number {
  if (uncertainty.digits <= 0n) throw new RangeError("an uncertainty must be above zero");
  if (rule === "gum") {
    const two = leading(uncertainty, 2);
    return two.digits === 100n ? two.scale - 1 : two.scale;
  }
  // After a carry, 999.6 to 1000, both branches below still hold: 1000 keeps two.
  const three = leading(uncertainty, 3);
  return three.digits <= 354n ? three.scale - 1 : three.scale - 2;
}

function leading(value: Decimal, count: number): Decimal {
  return roundToScale(value, value.scale - significantLength(value) + count);
}

/**
 * A value and its standard uncertainty, both to the place that the uncertainty allows. Half away from zero.
 * @param value decimal text
 * @param error decimal text, above zero
 * @returns decimal texts in plain notation
 * @throws RangeError for what is not a decimal number, or an error that is not above zero
 */
export function roundWithError(
  value: string,
  error: string,
  rule: RoundingRule = "pdg",
): { value: string; error: string } {
  const uncertainty = parseDecimal(error);
  const place = placeOfUncertainty(uncertainty, rule);
  // 0.9495 is 950 in three digits and so 1.0, although it is nearer to 0.9: the band decides.
  const carried = rule === "pdg" && leading(uncertainty, 3).digits >= 950n;
  return {
    value: formatDecimal(roundToScale(parseDecimal(value), place)),
    error: formatDecimal(carried ? { digits: 10n, scale: place } : roundToScale(uncertainty, place)),
  };
}
