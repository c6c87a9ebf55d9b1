import { ROLES, type Role } from "#app/database/enums.ts";

export { ROLES, type Role };

/** Who does something: a person at a request, with what the rules and the audit need of them. */
export interface Actor {
  personId: string;
  name: string;
  email: string;
  roles: readonly Role[];
  sessionId: string | null;
  requestId: string;
}
