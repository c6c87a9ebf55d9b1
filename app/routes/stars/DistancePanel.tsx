import type { DistanceReply } from "#app/catalogue/answer-distance.ts";
import type { DistanceCurve } from "#app/catalogue/distance-curve.ts";
import { lightLeftFigure } from "#app/figures/light-left.ts";
import { percentText, plainNumber, significantNumber } from "#app/figures/office-numbers.ts";
import { distanceFigure } from "#app/figures/range-figure.ts";
import { axisTicks } from "#app/ui/axis-ticks.ts";
import { BigNumber } from "#app/ui/BigNumber.tsx";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { fitDomain } from "#app/ui/spread-geometry.ts";
import { Arithmetic } from "./Arithmetic.tsx";
import { DistancePlot } from "./DistancePlot.tsx";
import { PRIOR_WORDS, REGIME_WORDS } from "./words.ts";

interface DistancePanelProps {
  distance: { reply: DistanceReply; curve: DistanceCurve | null } | null;
  name: string;
  /** The calendar year in which a visitor sees the light. */
  seenInYear: number;
}

/** The number that everything else is for: as large as the regime allows, its range beside it. */
export function DistancePanel({ distance, name, seenInYear }: DistancePanelProps) {
  if (!distance) {
    return (
      <div>
        <p className="label">Distance</p>
        <p className="max-w-words">No parallax is adopted yet, so nothing may be said of its distance.</p>
      </div>
    );
  }
  const { reply, curve } = distance;
  const label = `Distance, ${REGIME_WORDS[reply.regime]}${errorWords(reply)}`;
  if (!reply.ly || !reply.pc || !reply.text || !reply.method) {
    return (
      <div>
        <p className="label">{label}</p>
        <p className="max-w-words">{reply.reason ?? reply.warning}</p>
      </div>
    );
  }
  const { ly, regime, method } = reply;
  const figure = distanceFigure({ distance: ly, regime, method, unit: "ly", form: "value", language: "en" });
  const spread = {
    low: ly.low,
    high: ly.high,
    low90: ly.low90,
    high90: ly.high90,
    value: figure.value ? ly.value : undefined,
  };
  const domain = fitDomain([spread], 0.4);
  return (
    <div className="grid gap-8">
      <BigNumber
        label={label}
        value={figure.value ?? `${figure.low} to ${figure.high}`}
        unit={figure.unit}
        range={[figure.value ? `${figure.low} to ${figure.high}` : null, "68 %", figure.note]
          .filter(Boolean)
          .join(", ")}
        size={figure.value ? "large" : "range"}
      >
        <SpreadBar
          {...spread}
          domain={domain}
          size="large"
          ticks={axisTicks(domain).map((at) => ({ at, label: `${significantNumber(at, 4, "en")}` }))}
          label={reply.text.en}
        />
        <p className="mt-2 text-sm text-ink-soft">
          {method === "inverse" ? "1/p" : `${PRIOR_WORDS[method]}${priorScale(reply)}`};{" "}
          {significantNumber(reply.pc.value, 6, "en")} pc
        </p>
      </BigNumber>
      {reply.warning ? <p className="text-vermilion">{reply.warning}</p> : null}
      {curve ? <DistancePlot curve={curve} low={reply.pc.low} value={reply.pc.value} high={reply.pc.high} /> : null}
      <VisitorWords reply={reply} name={name} figure={figure.text} seenInYear={seenInYear} />
      <Arithmetic reply={reply} />
    </div>
  );
}

interface VisitorWordsProps {
  reply: DistanceReply;
  name: string;
  figure: string;
  seenInYear: number;
}

/** The figures as scenes bind them, in a plain sentence. */
function VisitorWords({ reply, name, figure, seenInYear }: VisitorWordsProps) {
  const { ly, method, regime } = reply;
  if (!ly || !method) return null;
  const left = lightLeftFigure({ distanceLy: ly, seenInYear, regime, method, form: "value", language: "en" });
  const look = "border-b-2 border-vermilion";
  return (
    <div>
      <p className="label">What a visitor reads</p>
      <p className="text-lg">
        {name} is <span className={look}>{figure}</span> away. The light seen this year left{" "}
        <span className={look}>{left.text}</span>.
      </p>
      <p className="text-sm text-ink-soft">
        fr <span lang="fr">{reply.text?.fr}</span>
      </p>
    </div>
  );
}

function errorWords({ fractionalError }: DistanceReply): string {
  if (fractionalError === null || fractionalError <= 0) return "";
  return ` (the error is ${percentText(fractionalError, "en")} of the parallax)`;
}

function priorScale({ prior }: DistanceReply): string {
  if (!prior) return "";
  return prior.name === "edsd"
    ? `, length ${plainNumber(prior.lengthPc, "en")} pc`
    : `, limit ${plainNumber(prior.limitPc, "en")} pc`;
}
