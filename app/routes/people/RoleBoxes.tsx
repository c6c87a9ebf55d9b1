import { ROLES, type Role } from "#app/audit/actor.ts";
import { Checkbox } from "#app/ui/Checkbox.tsx";
import { ROLE_WORDS } from "../office-places.ts";

const WHAT: Record<Role, string> = {
  editor: "keeps records and sources, builds scenes, writes the words",
  scientist: "vets records, verifies every number in an exhibit",
  publisher: "decides what goes live where and when, takes it back",
  admin: "people, kiosks, health; no editorial power",
};

export function RoleBoxes({ held, error }: { held: readonly Role[]; error?: string[] }) {
  return (
    <fieldset id="roles" tabIndex={-1} className="grid gap-1" aria-describedby={error ? "roles-error" : undefined}>
      <legend className="font-head text-sm font-medium">Roles</legend>
      {ROLES.map((role) => (
        <Checkbox
          key={role}
          name="roles"
          value={role}
          label={ROLE_WORDS[role]}
          hint={WHAT[role]}
          defaultChecked={held.includes(role)}
        />
      ))}
      {error ? (
        <p id="roles-error" className="text-sm text-vermilion">
          {error[0]}
        </p>
      ) : null}
    </fieldset>
  );
}
