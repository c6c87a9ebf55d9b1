import { Form, Link } from "react-router";
import { type ThemeChoice, ThemeForm } from "./ThemeForm.tsx";

export interface OfficePerson {
  name: string;
  /** In the words that people read: "curator", "staff scientist". */
  roles: readonly string[];
}

interface OfficeFootProps {
  centre: string;
  person: OfficePerson;
  theme: ThemeChoice;
  here: string;
}

/** Whose desk this is, and the way out. */
export function OfficeFoot({ centre, person, theme, here }: OfficeFootProps) {
  return (
    <div className="grid gap-4 font-head text-xs">
      <ThemeForm theme={theme} here={here} />
      <div>
        <p className="text-ink-soft">{centre}</p>
        <Link to="/account" className="link text-sm font-medium">
          {person.name}
        </Link>
        <p className="text-ink-soft">{person.roles.join(", ")}</p>
      </div>
      <Form method="post" action="/sign-out">
        <button type="submit" className="tap link text-sm text-ink-soft hover:text-ink">
          Sign out
        </button>
      </Form>
    </div>
  );
}
