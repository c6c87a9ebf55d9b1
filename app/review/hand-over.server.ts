import type { Role } from "#app/audit/actor.ts";
import type { Change } from "#app/audit/change.server.ts";
import { env } from "#app/env.server.ts";
import { readContributors, readPeopleOfRole, readStandingSeals } from "./signers.server.ts";

interface About {
  exhibitId: string;
  title: string;
}

function letter(name: string, lines: string[], exhibitId: string, page: "reviews" | "exhibits"): string {
  const url = `${env().PUBLIC_URL}/${page}/${exhibitId}`;
  return [`Dear ${name},`, ...lines, url, "Alidade, for the content team of Tern Point Science Centre"].join("\n\n");
}

/** Tells everybody of a role, except those whose own work it is, that it is their turn. */
export async function tellRole(c: Change, role: Role, about: About, subject: string, lines: string[]): Promise<void> {
  const contributors = await readContributors(c.tx, about.exhibitId);
  const signers = await readStandingSeals(c.tx, about.exhibitId);
  const except = [...contributors, ...signers].map((one) => one.personId);
  for (const person of await readPeopleOfRole(c.tx, role, except)) {
    c.mail({ to: person.email, subject, text: letter(person.name, lines, about.exhibitId, "reviews") });
  }
}

/** Tells the people who made an exhibit; the one who acts knows already. */
export async function tellContributors(c: Change, about: About, subject: string, lines: string[]): Promise<void> {
  for (const person of await readContributors(c.tx, about.exhibitId)) {
    if (person.personId === c.actor.personId) continue;
    c.mail({ to: person.email, subject, text: letter(person.name, lines, about.exhibitId, "exhibits") });
  }
}
