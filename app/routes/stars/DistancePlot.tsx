import type { DistanceCurve } from "#app/catalogue/distance-curve.ts";
import { significantNumber } from "#app/figures/office-numbers.ts";

const WIDTH = 420;
const HEIGHT = 130;

function path(heights: readonly number[]): string {
  const step = WIDTH / (heights.length - 1);
  // Half pixels are fine enough; whole doubles would only make the page longer.
  return heights
    .map((y, at) => `${at === 0 ? "M" : "L"}${tidy(at * step)} ${tidy(HEIGHT - y * (HEIGHT - 10))}`)
    .join("");
}

const tidy = (x: number) => Math.round(x * 2) / 2;
const text = (pc: number) => significantNumber(pc, 4, "en");

const LOOKS = {
  main: "fill-none stroke-ink stroke-2",
  likelihood: "fill-none stroke-ink-soft stroke-1",
  prior: "fill-none stroke-brass stroke-[1.5] [stroke-dasharray:4_4]",
};

interface DistancePlotProps {
  curve: DistanceCurve;
  low: number;
  value: number;
  high: number;
}

/** How sure, and of what: the measurement's likelihood, the prior, and what follows from both. */
export function DistancePlot({ curve, low, value, high }: DistancePlotProps) {
  const from = curve.at[0] ?? 0;
  const to = curve.at.at(-1) ?? 1;
  const place = (pc: number) => tidy(((Math.min(Math.max(pc, from), to) - from) / (to - from)) * WIDTH);
  const main = curve.posterior ?? curve.likelihood;
  return (
    <figure className="max-w-[34rem]">
      <figcaption className="label mb-2">How sure, and of what</figcaption>
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        className="w-full overflow-visible"
        role="img"
        aria-label={`Probability of each distance from ${text(from)} to ${text(to)} parsecs; 68 % of it lies between ${text(low)} and ${text(high)}.`}
      >
        <clipPath id="middle">
          <rect x={place(low)} y="0" width={place(high) - place(low)} height={HEIGHT} />
        </clipPath>
        <path
          d={`${path(main)}L${WIDTH} ${HEIGHT}L0 ${HEIGHT}Z`}
          clipPath="url(#middle)"
          className="fill-vermilion-wash"
        />
        {curve.prior ? <path d={path(curve.prior)} className={LOOKS.prior} /> : null}
        {curve.posterior ? <path d={path(curve.likelihood)} className={LOOKS.likelihood} /> : null}
        <path d={path(main)} className={LOOKS.main} />
        <line x1="0" x2={WIDTH} y1={HEIGHT} y2={HEIGHT} className="stroke-ink" />
        <line x1={place(value)} x2={place(value)} y1={HEIGHT} y2={HEIGHT + 6} className="stroke-ink stroke-2" />
      </svg>
      <div className="num relative mt-2 flex justify-between text-xs text-ink-soft" aria-hidden="true">
        <span>{text(from)} pc</span>
        <span>{text(to)} pc</span>
      </div>
      <Legend curve={curve} />
    </figure>
  );
}

function Legend({ curve }: { curve: DistanceCurve }) {
  const lines = curve.posterior
    ? [
        { look: LOOKS.main, words: "what follows" },
        { look: LOOKS.likelihood, words: "from the measurement alone" },
        { look: LOOKS.prior, words: "the prior" },
      ]
    : [{ look: LOOKS.main, words: "from the measurement alone; no prior has a weight" }];
  return (
    <ul className="mt-1 flex flex-wrap gap-x-5 text-sm text-ink-soft">
      {lines.map(({ look, words }) => (
        <li key={words} className="flex items-center gap-2">
          <svg aria-hidden="true" width="24" height="6" data-mark>
            <path d="M0 3h24" className={look} />
          </svg>
          {words}
        </li>
      ))}
      <li className="flex items-center gap-2">
        <svg aria-hidden="true" width="24" height="12" data-mark>
          <path d="M0 0h24v12h-24z" className="fill-vermilion-wash" />
        </svg>
        68 %
      </li>
    </ul>
  );
}
