interface Cited {
  authors: string;
  year: number;
  title: string;
  designation: string | null;
}

/** "van Leeuwen 2007, I/311": how a source is called in a table. */
export function shortCitation({ authors, year, designation }: Cited): string {
  return `${leadAuthor(authors)} ${year}${designation ? `, ${designation}` : ""}`;
}

/** The whole reference in one line. */
export function fullCitation(source: Cited): string {
  const { authors, year, title, designation } = source;
  return `${authors} (${year}). ${title}${designation ? ` [${designation}]` : ""}.`;
}

/** The family name of the first of "van Leeuwen, F." or "Perryman, M. A. C.; Lindegren, L."; "et al." for several. */
function leadAuthor(authors: string): string {
  const people = authors.split(/;| and /).map((one) => one.trim());
  const [first = authors] = people;
  const family = first.split(",")[0]?.trim() ?? first;
  return people.length > 1 ? `${family} et al.` : family;
}
