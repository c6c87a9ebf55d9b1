/**
 * The 19 characters of a bibliographic code, YYYYJJJJJVVVVMPPPPA: year, journal (left-aligned, led by a letter), volume,
 * a letter or digit of qualification, page, the first author's initial; gaps are dots.
 * Source: the ADS bibcode syntax (from memory; checked here against printed codes).
 */
const BIBCODE = /^(?:1[5-9]|20)\d{2}([A-Za-z0-9&.]{5})[A-Za-z0-9.]{9}[A-Z.]$/;
const JOURNAL = /^[A-Za-z][A-Za-z0-9&]*\.*$/;

/** As people paste it out of an address, where & is %26. */
export function plainBibcode(text: string): string {
  return text.trim().replaceAll("%26", "&");
}

export function isBibcode(text: string): boolean {
  const journal = BIBCODE.exec(text)?.[1];
  return journal !== undefined && JOURNAL.test(journal);
}

/** The year that a valid code begins with. */
export function yearOfBibcode(bibcode: string): number {
  return Number(bibcode.slice(0, 4));
}
