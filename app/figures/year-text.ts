import { type Language, shownDigits } from "./language.ts";

/** A calendar year as people count: there is no year 0. `count` is at least 1. */
export interface CountedYear {
  count: bigint;
  era: "before" | "since";
}

const ERA: Record<Language, Record<CountedYear["era"], string>> = {
  en: { before: " BCE", since: " CE" },
  fr: { before: " avant notre ère", since: " de notre ère" },
};

/** From the astronomers' count, in which 0 is the year before 1: -574 is 575 BCE. */
export function countedYear(astronomical: bigint): CountedYear {
  return astronomical >= 1n ? { count: astronomical, era: "since" } : { count: 1n - astronomical, era: "before" };
}

const digitsOf = ({ count }: CountedYear, language: Language) => shownDigits(count.toString(), language);

/** "2017", "575 BCE": the era is said only before the year 1. */
export function countedYearText(year: CountedYear, language: Language): string {
  return digitsOf(year, language) + (year.era === "before" ? ERA[language].before : "");
}

/** "between 1386 and 1547", "between 600 and 400 BCE", "between 120 BCE and 40 CE". */
export function yearsBetween(from: CountedYear, to: CountedYear, language: Language): string {
  const crossing = from.era !== to.era;
  const first = digitsOf(from, language) + (crossing ? ERA[language][from.era] : "");
  const last = digitsOf(to, language) + (crossing || to.era === "before" ? ERA[language][to.era] : "");
  return language === "fr" ? `entre ${first} et ${last}` : `between ${first} and ${last}`;
}

/**
 * A calendar year: "2017", "575 BCE"; never grouped below five digits.
 * @param astronomical whole number; 0 is 1 BCE, -574 is 575 BCE
 * @throws RangeError when it is not a safe whole number
 */
export function yearText(astronomical: number, language: Language): string {
  if (!Number.isSafeInteger(astronomical)) throw new RangeError(`${astronomical} is not a whole year`);
  return countedYearText(countedYear(BigInt(astronomical)), language);
}
