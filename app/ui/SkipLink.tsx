/** The first thing a keyboard reaches; every page has one `<main id="main">`. */
export function SkipLink({ label = "Skip to the content" }: { label?: string }) {
  return (
    <a
      href="#main"
      data-screen-only
      className="fixed left-2 top-2 z-50 -translate-y-24 border border-ink bg-paper px-4 py-2 font-head text-sm font-medium text-ink focus:translate-y-0"
    >
      {label}
    </a>
  );
}
