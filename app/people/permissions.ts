import type { Role } from "#app/audit/actor.ts";

/**
 * The role matrix: who may do what. Data, shared by verbs and pages; a test walks every route and verb against it.
 * That nobody signs their own work is a rule about persons and stands in the verbs, not here.
 */
const EVERYBODY = ["editor", "scientist", "publisher", "admin"] as const;
const CURATORS = ["editor", "scientist"] as const;

export const PERMISSIONS = {
  "account.use": EVERYBODY,
  "people.manage": ["admin"],
  "mail.read": ["admin"],
  "audit.read": EVERYBODY,
  "catalogue.read": EVERYBODY,
  "source.write": CURATORS,
  "record.write": CURATORS,
  "record.adopt": CURATORS,
  "record.vet": ["scientist"],
  "intake.write": CURATORS,
  "media.read": EVERYBODY,
  "media.write": ["editor"],
  "exhibit.read": EVERYBODY,
  "exhibit.write": ["editor"],
  "exhibit.submit": ["editor"],
  "review.read": EVERYBODY,
  "review.verify": ["scientist"],
  "review.approve": ["publisher"],
  "review.send-back": ["scientist", "publisher"],
  "edition.read": EVERYBODY,
  "edition.publish": ["publisher"],
  "kiosk.read": EVERYBODY,
  "kiosk.manage": ["admin"],
  "kiosk.assign": ["publisher"],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

export function mayDo(roles: readonly Role[], permission: Permission): boolean {
  const allowed: readonly Role[] = PERMISSIONS[permission];
  return roles.some((role) => allowed.includes(role));
}
