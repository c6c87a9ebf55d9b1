/** Who does something: a person at a request, with what the rules and the audit need of them. */
export interface Actor {
  personId: string;
  name: string;
  email: string;
  roles: readonly Role[];
  sessionId: string | null;
  requestId: string;
}

export const ROLES = ["editor", "scientist", "publisher", "admin"] as const;
export type Role = (typeof ROLES)[number];
