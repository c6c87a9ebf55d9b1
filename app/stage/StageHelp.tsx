import type { StageWords } from "./words.ts";

interface StageHelpProps {
  words: StageWords;
  /** What the stage shows, for those who do not see it. */
  stillAlt: string;
  /** The stage is described by this element. */
  id: string;
  kiosk: boolean;
}

/** How to turn, come near and choose. A kiosk tells of keys only when somebody uses them. */
export function StageHelp({ words, stillAlt, id, kiosk }: StageHelpProps) {
  const keysShown = kiosk ? "sr-only group-has-[[role=application]:focus-visible]:not-sr-only" : "";
  return (
    <p id={id} className={`border-rule border-t px-3 text-ink-soft ${kiosk ? "py-3 text-lg" : "py-1.5 text-xs"}`}>
      <span className="sr-only">{stillAlt} </span>
      {words.gestures} <span className={keysShown}>{words.keys}</span>
    </p>
  );
}
