import { Link, NavLink } from "react-router";
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
      <ul className="-mb-px forced-colors:mb-0 flex flex-wrap gap-x-6">
        {tabs.map((tab) => (
          <li key={tab.to}>
            <TabLink {...tab} />
          </li>
        ))}
      </ul>
    </nav>
  );
}

function TabLink({ to, label, count, current }: Tab) {
  const words = (
    <>
      {label}
      {count ? <span className="num text-ink-soft">{count}</span> : null}
    </>
  );
  if (current === undefined) {
    return (
      <NavLink to={to} end preventScrollReset className={({ isActive }) => tabClass(isActive)}>
        {words}
      </NavLink>
    );
  }
  return (
    <Link to={to} preventScrollReset aria-current={current ? "page" : undefined} className={tabClass(current)}>
      {words}
    </Link>
  );
}

function tabClass(current: boolean): string {
  return classes(
    "tap flex items-center gap-2 border-b-3 font-head text-sm",
    current
      ? "border-ink font-medium text-ink"
      : "border-transparent text-ink-soft forced-colors:border-[Canvas] hover:border-rule hover:text-ink",
  );
}
