import { NavLink } from "react-router";
import { classes } from "./classes.ts";

export interface Tab {
  to: string;
  label: string;
  /** Already in words: how many wait behind this tab. */
  count?: string;
  /** For tabs that differ in their query only, which the router cannot tell apart. */
  current?: boolean;
}

interface TabsProps {
  /** Names the group for listeners. */
  label: string;
  tabs: readonly Tab[];
}

/** Tabs are links: each has an address, and each works without JavaScript. */
export function Tabs({ label, tabs }: TabsProps) {
  return (
    <nav aria-label={label} className="mb-6 border-b border-rule">
      <ul className="-mb-px flex flex-wrap gap-x-6">
        {tabs.map((tab) => (
          <li key={tab.to}>
            <NavLink
              to={tab.to}
              end
              preventScrollReset
              aria-current={tab.current === false ? undefined : "page"}
              className={({ isActive }) => tabClass(tab.current ?? isActive)}
            >
              {tab.label}
              {tab.count ? <span className="num text-ink-soft">{tab.count}</span> : null}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function tabClass(current: boolean): string {
  return classes(
    "tap flex items-center gap-2 border-b-3 font-head text-sm",
    current ? "border-ink font-medium text-ink" : "border-transparent text-ink-soft hover:border-rule hover:text-ink",
  );
}
