import { createSource } from "#app/catalogue/create-source.server.ts";
import { CreateSource } from "#app/catalogue/source-input.ts";
import { parseInput } from "#app/parse-input.ts";
import type { Team } from "./accounts.ts";

/** What the demo's numbers were published in; bibcodes and DOIs from memory, as their notes say. */
const SOURCES = {
  hipparcos: {
    designation: "I/311",
    title: "Validation of the new Hipparcos reduction",
    authors: "van Leeuwen, F.",
    year: "2007",
    bibcode: "2007A&A...474..653V",
    doi: "10.1051/0004-6361:20078357",
    note: "Parallaxes of the demo. Bibcode and DOI from memory.",
  },
  photometry: {
    designation: "I/239",
    title: "The HIPPARCOS Catalogue",
    authors: "Perryman, M. A. C.; Lindegren, L.; Kovalevsky, J.; et al.",
    year: "1997",
    bibcode: "1997A&A...323L..49P",
    note: "Magnitudes and colours of the demo, in Johnson's V and B−V. Bibcode from memory.",
  },
  gaia: {
    designation: "I/355",
    title: "Gaia Data Release 3. Summary of the content and survey properties",
    authors: "Gaia Collaboration; Vallenari, A.; Brown, A. G. A.; et al.",
    year: "2023",
    bibcode: "2023A&A...674A...1G",
    doi: "10.1051/0004-6361/202243940",
    note: "Sharper than I/311 for faint near stars. Bibcode and DOI from memory.",
  },
} as const;

export type Sources = Record<keyof typeof SOURCES, string>;

/** Source ids by what they are used for. */
export async function keepSources(team: Team): Promise<Sources> {
  const keep = (of: keyof typeof SOURCES) => createSource(team.curator, parseInput(CreateSource, SOURCES[of]));
  return { hipparcos: await keep("hipparcos"), photometry: await keep("photometry"), gaia: await keep("gaia") };
}
