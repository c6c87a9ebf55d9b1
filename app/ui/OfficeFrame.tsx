import type { ReactNode } from "react";
import { classes } from "./classes.ts";
import { OfficeFoot, type OfficePerson } from "./OfficeFoot.tsx";
import { OfficePlaces, type Place } from "./OfficePlaces.tsx";
import type { ThemeChoice } from "./ThemeForm.tsx";

export interface OfficeFrameProps {
  /** Name of the science centre. */
  centre: string;
  person: OfficePerson;
  /** Places in groups, in the order in which they are shown. */
  places: readonly (readonly Place[])[];
  theme: ThemeChoice;
  /** Where the page is now: the folded menu of a phone closes when it changes, and forms come back to it. */
  here: string;
  /** The page brings its own margins (a builder, a stage). */
  bleed?: boolean;
  children: ReactNode;
}

/** The office: places at the side, the page beside them. On a phone the places fold away, without JavaScript too. */
export function OfficeFrame({ centre, person, places, theme, here, bleed, children }: OfficeFrameProps) {
  const foot = <OfficeFoot centre={centre} person={person} theme={theme} here={here} />;
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[--spacing(42)_minmax(0,1fr)] print:block">
      <header data-screen-only className="border-b border-ink lg:hidden">
        <details key={here} className="group">
          <summary className="tap flex list-none items-center justify-between px-5 py-2 font-head focus-visible:-outline-offset-4">
            <span className="text-lg font-bold">Alidade</span>
            <span className="text-sm font-medium underline decoration-edge underline-offset-4">
              <span className="group-open:hidden">Places</span>
              <span className="hidden group-open:inline">Close</span>
            </span>
          </summary>
          <div className="grid gap-6 px-5 pb-6">
            <OfficePlaces groups={places} />
            {foot}
          </div>
        </details>
      </header>
      <header data-screen-only className="border-r border-rule max-lg:hidden">
        <div className="sticky top-0 -mr-px forced-colors:mr-0 flex h-dvh flex-col gap-8 overflow-y-auto py-7 pl-7">
          <p className="font-head text-lg font-bold">Alidade</p>
          <OfficePlaces groups={places} />
          <div className="mt-auto pr-4">{foot}</div>
        </div>
      </header>
      <main id="main" tabIndex={-1} className={classes("min-w-0 focus-visible:outline-none", !bleed && "page")}>
        {children}
      </main>
    </div>
  );
}
