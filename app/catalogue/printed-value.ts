/** A number as a source prints it, perhaps with its error: what was parsed, and nothing guessed. */
export interface PrintedValue {
  /** Plain decimal text, digits kept. */
  value: string;
  error: string | null;
}

const NUMBER = String.raw`[+\-\u2212]?(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:[eE][+\-\u2212]?\d+)?`;
const PRINTED = new RegExp(String.raw`^(${NUMBER})(?:\s*(?:±|\+\/?-|\+\/?\u2212)\s*(${NUMBER}))?$`);

/**
 * Reads "130.23", "130.23 ± 0.36", "130.23+-0.36", with ASCII or typographic minus.
 * @throws RangeError that says what is wrong, a decimal comma among it
 */
export function parsePrinted(text: string): PrintedValue {
  const match = PRINTED.exec(text.trim());
  if (!match?.[1]) throw new RangeError(`“${text.trim()}” is not a number, nor a number ± its error.`);
  return { value: measuredNumberText(match[1]), error: match[2] === undefined ? null : measuredNumberText(match[2]) };
}

/** One number alone. @throws RangeError */
export function plainNumberText(text: string): string {
  const trimmed = text.trim();
  if (trimmed.includes(",")) {
    throw new RangeError(`“${trimmed}” has a comma: write ${trimmed.replace(",", ".")} if it is a decimal comma.`);
  }
  const plain = trimmed.replaceAll("\u2212", "-").replace(/^\+/, "");
  if (!/^-?(\d+\.?\d*|\.\d+)([eE][+-]?\d+)?$/.test(plain) || !Number.isFinite(Number(plain))) {
    throw new RangeError(`“${trimmed}” is not a number.`);
  }
  if (plain.length > 40) throw new RangeError("A number of at most 40 characters.");
  return plain;
}

const LARGEST = 1e12;

/** One number that can have been measured: in no unit known here is anything beyond a million million or below its inverse. @throws RangeError */
export function measuredNumberText(text: string): string {
  const plain = plainNumberText(text);
  const size = Math.abs(Number(plain));
  if (size > LARGEST || (size !== 0 && size < 1 / LARGEST)) {
    throw new RangeError(`“${text.trim()}” is beyond anything that is measured in these units.`);
  }
  return plain;
}
