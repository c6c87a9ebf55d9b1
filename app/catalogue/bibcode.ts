/**
 * The 19 characters of a bibliographic code, YYYYJJJJJVVVVMPPPPA: year, journal (left-aligned), volume (right-aligned),
 * a letter or digit of qualification, page (right-aligned), the first author's initial; gaps are dots.
 * Source: the ADS bibcode syntax (from memory; checked here against printed codes).
 */
const BIBCODE = /^(1[5-9]|20)\d{2}[A-Za-z&.]{5}[\w.]{4}[\w.][\w.]{4}[A-Z.]$/;

export function isBibcode(text: string): boolean {
  return text.length === 19 && BIBCODE.test(text);
}
