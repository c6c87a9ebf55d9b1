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

/** How sure, and of what: the measurement's likelihood, the prior, and what follows from both. */
export function DistancePlot({ curve, low, high }: { curve: DistanceCurve; low: number; high: number }) {
  const from = curve.at[0] ?? 0;
  const to = curve.at.at(-1) ?? 1;
  const place = (pc: number) => tidy(((Math.min(Math.max(pc, from), to) - from) / (to - from)) * WIDTH);
  const main = curve.posterior ?? curve.likelihood;
  const text = (pc: number) => significantNumber(pc, 4, "en");
  return (
    <figure>
      <figcaption className="label mb-2">How sure, and of what</figcaption>
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT + 22}`}
        className="w-full max-w-[34rem] overflow-visible"
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
        {curve.prior ? (
          <path d={path(curve.prior)} className="fill-none stroke-brass" strokeDasharray="4 4" strokeWidth="1.25" />
        ) : null}
        {curve.posterior ? (
          <path d={path(curve.likelihood)} className="fill-none stroke-ink-soft" strokeWidth="1" />
        ) : null}
        <path d={path(main)} className="fill-none stroke-ink" strokeWidth="2" />
        <line x1="0" x2={WIDTH} y1={HEIGHT} y2={HEIGHT} className="stroke-ink" />
        <g className="fill-ink-soft font-head text-xs">
          <text x="0" y={HEIGHT + 18}>{`${text(from)} pc`}</text>
          <text x={WIDTH} y={HEIGHT + 18} textAnchor="end">{`${text(to)} pc`}</text>
        </g>
      </svg>
      <p className="mt-1 text-sm text-ink-soft">
        {curve.posterior
          ? "Heavy: what follows. Thin: from the measurement alone. Dashed: the prior. Shaded: 68 %."
          : "From the measurement alone. Shaded: 68 %."}
      </p>
    </figure>
  );
}
