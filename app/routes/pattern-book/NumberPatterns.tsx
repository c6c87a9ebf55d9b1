import { BigNumber } from "#app/ui/BigNumber.tsx";
import { BoundFigure } from "#app/ui/BoundFigure.tsx";
import { Button } from "#app/ui/Button.tsx";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { Time } from "#app/ui/Time.tsx";
import { Pattern } from "./Chapter.tsx";

const NARROW = { value: 25.04, low: 24.98, high: 25.11, low90: 24.93, high90: 25.15 };
const AXIS = [24.85, 25.25] as const;
const TICKS = [
  { at: 24.9, label: "24.9 ly" },
  { at: 25, label: "25.0" },
  { at: 25.1, label: "25.1" },
  { at: 25.2, label: "25.2 ly" },
];
const COMPARED = [100, 1000] as const;

/** The numbers here are drawn, not measured. */
export function NumberPatterns() {
  return (
    <div className="grid gap-x-14 lg:grid-cols-2">
      <Pattern title="Big number with a large spread bar">
        <BigNumber label="Distance, firm" value="25.04" unit="light-years" range="24.98 to 25.11, 68 %">
          <SpreadBar
            {...NARROW}
            domain={AXIS}
            ticks={TICKS}
            size="large"
            label="25.04 light-years, between 24.98 and 25.11"
          />
        </BigNumber>
      </Pattern>
      <Pattern title="Only a range may be shown">
        <BigNumber label="Distance, wide" value="480 to 640" unit="light-years" size="large">
          <SpreadBar
            low={480}
            high={640}
            low90={430}
            high90={760}
            size="large"
            label="Between 480 and 640 light-years"
          />
        </BigNumber>
      </Pattern>
      <Pattern title="Small bars on one axis">
        <div className="grid max-w-md grid-cols-[7rem_1fr] items-center gap-x-4 gap-y-2 text-sm">
          <span>in use</span>
          <SpreadBar
            value={300}
            low={285}
            high={315}
            low90={276}
            high90={326}
            domain={COMPARED}
            label="300, 285 to 315"
          />
          <span>superseded</span>
          <SpreadBar value={270} low={230} high={320} domain={COMPARED} muted label="270, 230 to 320" />
          <span>no upper end</span>
          <SpreadBar
            value={520}
            low={410}
            high={Number.POSITIVE_INFINITY}
            domain={COMPARED}
            label="520, at least 410"
          />
          <span>no lower end</span>
          <SpreadBar low={-20} high={190} domain={COMPARED} label="at most 190" />
          <span>very narrow</span>
          <SpreadBar value={640} low={639.8} high={640.2} domain={COMPARED} label="640, 639.8 to 640.2" />
        </div>
      </Pattern>
      <Pattern title="Text with bound numbers">
        <p className="max-w-words text-lg">
          α Lyrae is <BoundFigure>25.0 light-years</BoundFigure> away, about{" "}
          <BoundFigure to="?chapter=numbers">three times as far</BoundFigure> as α Canis Majoris. Vetted on{" "}
          <Time at="2026-11-12T09:30:00Z" />, sealed <Time at="2026-11-14T16:05:00Z" form="moment" />.
        </p>
      </Pattern>
      <div className="night p-6 lg:col-span-2">
        <Pattern title="The same at night">
          <div className="grid gap-8 md:grid-cols-2">
            <BigNumber label="Distance" value="103.9" unit="light-years" range="between 103.1 and 104.7">
              <SpreadBar
                value={103.9}
                low={103.1}
                high={104.7}
                size="large"
                label="103.9 light-years, 103.1 to 104.7"
              />
            </BigNumber>
            <div className="grid content-start justify-items-start gap-6">
              <p className="text-lg text-ink-soft">
                The light you see tonight set out in <BoundFigure>1922 or 1923</BoundFigure>.
              </p>
              <Button className="target-mm-14">How do we know?</Button>
            </div>
          </div>
        </Pattern>
      </div>
    </div>
  );
}
