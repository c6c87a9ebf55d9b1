import type { LanguageCode, Licence } from "#app/database/enums.ts";

/** How a licence is named beside a picture; the short names of Creative Commons are the same in both languages. */
export const LICENCE_WORDS: Record<LanguageCode, Record<Licence, string>> = {
  en: {
    "CC0-1.0": "CC0 1.0, no rights reserved",
    "CC-BY-4.0": "CC BY 4.0",
    "CC-BY-SA-4.0": "CC BY-SA 4.0",
    "public-domain": "public domain",
    "own-work": "our own work",
    "by-written-permission": "by written permission",
  },
  fr: {
    "CC0-1.0": "CC0 1.0, aucun droit réservé",
    "CC-BY-4.0": "CC BY 4.0",
    "CC-BY-SA-4.0": "CC BY-SA 4.0",
    "public-domain": "domaine public",
    "own-work": "notre propre travail",
    "by-written-permission": "avec autorisation écrite",
  },
};

/** "M. Tern, Tern Point (our own work)": what stands under a picture wherever it is shown. */
export function creditText(picture: { creditLine: string; licence: Licence }, language: LanguageCode): string {
  return `${picture.creditLine} (${LICENCE_WORDS[language][picture.licence]})`;
}
