import { type Measured, measurePosterior } from "./posterior.ts";

// Speed as ratios against something else measured in the same run; never a test that can fail on a busy machine.
const measured: Measured[] = [measurePosterior()];

if (process.argv.includes("--json")) console.log(JSON.stringify(measured));
else {
  for (const { name, value, unit, baseline, ratio } of measured) {
    console.log(
      `${name}: ${value.toPrecision(3)} ${unit} against ${baseline.toPrecision(3)}, ${ratio.toPrecision(3)} times`,
    );
  }
}
