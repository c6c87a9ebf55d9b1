export type Language = "en" | "fr";

/** A no-break space: a number and its unit never part at the end of a line. */
export const NO_BREAK = "\u00a0";
const NARROW_NO_BREAK = "\u202f";
const MINUS = "\u2212";

const MARKS: Record<Language, { point: string; group: string }> = {
  en: { point: ".", group: "," },
  fr: { point: ",", group: NARROW_NO_BREAK },
};

/** Groups of three from five digits on: "1234", "12,345". */
const SHORTEST_GROUPED = 5;

/**
 * Plain decimal text ("-1234567.5") as a reader of the language writes it: decimal mark, groups of three, typographic
 * minus. Digits are kept, none is added.
 */
export function shownDigits(plain: string, language: Language): string {
  const { point, group } = MARKS[language];
  const negative = plain.startsWith("-");
  const [whole = "", fraction] = plain.replace(/^[-+]/, "").split(".");
  const grouped = whole.length < SHORTEST_GROUPED ? whole : whole.replace(/\B(?=(\d{3})+(?!\d))/g, group);
  return `${negative ? MINUS : ""}${grouped}${fraction === undefined ? "" : point + fraction}`;
}

/**
 * The plain decimal text behind shown digits: the inverse of shownDigits.
 * @throws RangeError when the text is not a number as shownDigits writes it
 */
export function parseShown(shown: string, language: Language): string {
  const { point, group } = MARKS[language];
  const plain = shown.replace(MINUS, "-").replaceAll(group, "").replace(point, ".");
  if (!/^-?(0|[1-9]\d*)(\.\d+)?$/.test(plain) || shownDigits(plain, language) !== shown) {
    throw new RangeError(`"${shown}" is not a number as it is shown in ${language}`);
  }
  return plain;
}
