/** A DOI: "10.", a registrant of four to nine digits, a slash, a suffix (ISO 26324; the form that Crossref recommends). */
const DOI = /^10\.\d{4,9}(\.\d+)*\/[^\s]+$/;

/** Takes "doi:10...." and "https://doi.org/10...." as people paste them; compares without regard to case. */
export function plainDoi(text: string): string {
  return text
    .trim()
    .replace(/^(https?:\/\/(dx\.)?doi\.org\/|doi:\s*)/i, "")
    .toLowerCase();
}

export function isDoi(text: string): boolean {
  return DOI.test(text);
}
