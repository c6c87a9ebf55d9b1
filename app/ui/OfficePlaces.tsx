import { NavLink } from "react-router";
import { classes } from "./classes.ts";

export interface Place {
  to: string;
  label: string;
  /** Already in words: how much waits there for this person. */
  waiting?: string;
}

export function OfficePlaces({ groups }: { groups: readonly (readonly Place[])[] }) {
  return (
    <nav aria-label="Places" className="grid gap-5">
      {groups.map((places) => (
        <ul key={places.map((place) => place.to).join(" ")} className="grid max-lg:grid-cols-2 max-lg:gap-x-6">
          {places.map((place) => (
            <li key={place.to}>
              <NavLink to={place.to} className={({ isActive }) => placeClass(isActive)}>
                {place.label}
                {place.waiting ? <span className="num font-medium text-vermilion">{place.waiting}</span> : null}
              </NavLink>
            </li>
          ))}
        </ul>
      ))}
    </nav>
  );
}

function placeClass(current: boolean): string {
  return classes(
    "flex min-h-8 items-center justify-between gap-2 border-r-3 pr-4 font-head text-sm max-lg:min-h-11 max-lg:border-r-0 max-lg:border-l-3 max-lg:pl-3",
    current
      ? "border-ink font-bold text-ink"
      : "border-transparent text-ink-soft forced-colors:border-[Canvas] hover:text-ink hover:underline",
  );
}
