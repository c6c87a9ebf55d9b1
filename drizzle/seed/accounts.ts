import type { Actor, Role } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { newId } from "#app/database/new-id.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { hashPassword } from "#app/people/password.server.ts";

/** Known to everybody who reads the README; the seed refuses a database that is not on this machine. */
export const DEMO_PASSWORD = "tern-point-demo";

interface Account {
  key: "curator" | "secondCurator" | "scientist" | "secondScientist" | "publisher" | "admin";
  name: string;
  email: string;
  roles: Role[];
}

/** The content team of Tern Point Science Centre, an invented place. */
export const ACCOUNTS: Account[] = [
  { key: "curator", name: "Ines Varga", email: "ines@tern-point.example", roles: ["editor"] },
  { key: "secondCurator", name: "Tomas Okoro", email: "tomas@tern-point.example", roles: ["editor"] },
  { key: "scientist", name: "Dr Leila Brandt", email: "leila@tern-point.example", roles: ["scientist"] },
  { key: "secondScientist", name: "Dr Ansel Mori", email: "ansel@tern-point.example", roles: ["scientist"] },
  { key: "publisher", name: "Maud Kerrigan", email: "maud@tern-point.example", roles: ["publisher"] },
  { key: "admin", name: "Priya Lund", email: "priya@tern-point.example", roles: ["admin"] },
];

export type Team = Record<Account["key"], Actor>;

const NOBODY: Actor = { personId: "", name: "Demo", email: "", roles: [], sessionId: null, requestId: "seed" };

/** Opens the accounts with the demo password; invitations would need somebody to answer them. */
export async function openAccounts(): Promise<Team> {
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const team: Partial<Team> = {};
  await change(NOBODY, "seed.open-accounts", async (c) => {
    for (const { key, name, email, roles } of ACCOUNTS) {
      const personId = newId();
      await c.tx.insert(person).values({ id: personId, name, email, state: "active", passwordHash });
      await c.tx.insert(personRole).values(roles.map((role) => ({ personId, role })));
      c.audit({ objectType: "person", objectId: personId, objectName: name, after: { name, email, roles } });
      team[key] = { personId, name, email, roles, sessionId: null, requestId: "seed" };
    }
  });
  return team as Team;
}
