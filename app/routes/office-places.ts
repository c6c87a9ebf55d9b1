import type { Role } from "#app/audit/actor.ts";
import { mayDo, type Permission } from "#app/people/permissions.ts";
import type { Place } from "#app/ui/OfficePlaces.tsx";

const PLACES: readonly (readonly (Place & { needs: Permission })[])[] = [
  [{ to: "/desk", label: "Desk", needs: "account.use" }],
  [
    { to: "/stars", label: "Stars", needs: "catalogue.read" },
    { to: "/sources", label: "Sources", needs: "catalogue.read" },
    { to: "/intake", label: "Intake", needs: "intake.write" },
  ],
  [
    { to: "/exhibits", label: "Exhibits", needs: "exhibit.read" },
    { to: "/media", label: "Media", needs: "media.read" },
  ],
  [
    { to: "/reviews", label: "Reviews", needs: "review.read" },
    { to: "/editions", label: "Editions", needs: "edition.read" },
    { to: "/kiosks", label: "Kiosks", needs: "kiosk.read" },
  ],
  [
    { to: "/people", label: "People", needs: "people.manage" },
    { to: "/audit", label: "Audit", needs: "audit.read" },
    { to: "/mail", label: "Mail", needs: "mail.read" },
    { to: "/pattern-book", label: "Pattern book", needs: "people.manage" },
  ],
];

/** The places of the office that these roles may enter, in the order in which they are shown. */
export function officePlaces(roles: readonly Role[]): Place[][] {
  return PLACES.map((group) =>
    group.filter(({ needs }) => mayDo(roles, needs)).map(({ to, label }) => ({ to, label })),
  ).filter((group) => group.length > 0);
}

/** The roles in the words of PRODUCT.md. */
export const ROLE_WORDS: Record<Role, string> = {
  editor: "curator",
  scientist: "staff scientist",
  publisher: "publisher",
  admin: "administrator",
};
