import type { StageWords } from "./words.ts";

interface StageButtonsProps {
  words: StageWords;
  kiosk: boolean;
  onTurn: (direction: -1 | 1) => void;
  onMove: (direction: "nearer" | "farther") => void;
  onReset: () => void;
}

/** Everything that a drag, a pinch or a key does can be done by pressing a button. */
export function StageButtons({ words, kiosk, onTurn, onMove, onReset }: StageButtonsProps) {
  const buttons: [string, () => void][] = [
    [words.turnLeft, () => onTurn(-1)],
    [words.turnRight, () => onTurn(1)],
    [words.nearer, () => onMove("nearer")],
    [words.farther, () => onMove("farther")],
    [words.startAgain, onReset],
  ];
  return (
    <div className="flex flex-wrap border-t border-rule">
      {buttons.map(([name, press]) => (
        <button
          key={name}
          type="button"
          onClick={press}
          className={`tap grow border-r border-rule px-3 font-head font-medium text-ink last:border-r-0 hover:bg-paper-shade focus-visible:-outline-offset-4 ${kiosk ? "py-6 text-xl" : "text-sm"}`}
        >
          {name}
        </button>
      ))}
    </div>
  );
}
