import { PC_LY } from "#app/astrometry/units.ts";
import type { DistanceReply } from "#app/catalogue/answer-distance.ts";
import { percentText, plainNumber, significantNumber } from "#app/figures/office-numbers.ts";
import { DefinitionList } from "#app/ui/DefinitionList.tsx";
import { Disclosure } from "#app/ui/Disclosure.tsx";

const DIGITS = 6;
const some = (value: number) => significantNumber(value, DIGITS, "en");
const pc = (value: number) => (Number.isFinite(value) ? `${some(value)} pc` : "without end");

function regimeWords({ fractionalError, regime }: DistanceReply): string {
  if (fractionalError === null || fractionalError <= 0) return `not above zero: ${regime}`;
  return `${percentText(fractionalError, "en")}: ${regime}`;
}

function byInversion(
  { parallaxMas: p, errorMas: s }: DistanceReply,
  range: { value: number; low: number; high: number },
) {
  const [parallax, error] = [plainNumber(p, "en"), plainNumber(s, "en")];
  return [
    { term: "Value", value: `1000 / ${parallax} = ${pc(range.value)}` },
    { term: "Near end", value: `1000 / (${parallax} + ${error}) = ${pc(range.low)}` },
    { term: "Far end", value: `1000 / (${parallax} − ${error}) = ${pc(range.high)}` },
  ];
}

function byPosterior({ prior, modes }: DistanceReply, range: { value: number; low: number; high: number }) {
  const density = prior?.name === "edsd" ? "r² exp(−r / L)" : prior?.name === "uniform-density" ? "r²" : "1";
  const bound =
    prior?.name === "edsd"
      ? `L = ${plainNumber(prior.lengthPc, "en")} pc`
      : `r up to ${plainNumber(prior?.limitPc ?? 0, "en")} pc`;
  return [
    { term: "Prior", value: `${density}, ${bound}` },
    { term: "Measurement", value: "exp(−(p − 1/r)² / 2s²)" },
    { term: "Median", value: pc(range.value), note: "of prior times measurement, over all r" },
    { term: "16 %", value: pc(range.low) },
    { term: "84 %", value: pc(range.high) },
    { term: modes.length > 1 ? "Peaks" : "Peak", value: modes.map(pc).join(", ") },
  ];
}

const SOURCES = {
  inverse: "1/p with p ± s, where s/p is at most a fifth: Bailer-Jones 2015, PASP 127, 994.",
  posterior: "Bailer-Jones 2015, PASP 127, 994; Astraatmadja & Bailer-Jones 2016, ApJ 832, 137.",
};

/** How the distance came out of the parallax, step by step, so that it can be worked out again by hand. */
export function Arithmetic({ reply }: { reply: DistanceReply }) {
  const range = reply.pc;
  if (!range) return null;
  const inverse = reply.method === "inverse";
  return (
    <Disclosure summary="Unfold the arithmetic">
      <DefinitionList
        items={[
          { term: "Error / parallax", value: regimeWords(reply) },
          ...(inverse ? byInversion(reply, range) : byPosterior(reply, range)),
          { term: "In light-years", value: `× ${some(PC_LY)} = ${some(range.value * PC_LY)}` },
        ]}
      />
      <p className="mt-2 text-sm text-ink-soft">{inverse ? SOURCES.inverse : SOURCES.posterior}</p>
    </Disclosure>
  );
}
