import type { Language } from "./language.ts";

export type WordedUnit = "ly" | "pc" | "au" | "km" | "yr";

type Forms = Record<"one" | "other", string>;

const WORDS: Record<Language, Record<WordedUnit, Forms>> = {
  en: {
    ly: { one: "light-year", other: "light-years" },
    pc: { one: "parsec", other: "parsecs" },
    au: { one: "astronomical unit", other: "astronomical units" },
    km: { one: "kilometre", other: "kilometres" },
    yr: { one: "year", other: "years" },
  },
  fr: {
    ly: { one: "année-lumière", other: "années-lumière" },
    pc: { one: "parsec", other: "parsecs" },
    au: { one: "unité astronomique", other: "unités astronomiques" },
    km: { one: "kilomètre", other: "kilomètres" },
    yr: { one: "an", other: "ans" },
  },
};

/**
 * The unit's word for a number as it is shown: "1 light-year" but "1.0 light-years"; French "1,5 année-lumière".
 * The plural rules are Unicode CLDR's, asked with as many decimals as are shown. (CLDR's French "many", for whole
 * millions, belongs to "million d'..."; digits written in full take the ordinary plural.)
 * @param plain the shown number in plain decimal text
 */
export function unitWord(plain: string, unit: WordedUnit, language: Language): string {
  // Plural rules look no further than whether there are decimals; twenty is the most that every engine takes.
  const decimals = Math.min(plain.split(".")[1]?.length ?? 0, 20);
  const rules = new Intl.PluralRules(language, { minimumFractionDigits: decimals, maximumFractionDigits: decimals });
  const form = rules.select(Math.abs(Number(plain))) === "one" ? "one" : "other";
  return WORDS[language][unit][form];
}
