import { execFileSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { distancePosterior, type Prior } from "#app/astrometry/posterior.ts";
import { readTable } from "#tests/reference/table.ts";

export interface Measured {
  name: string;
  value: number;
  unit: string;
  baseline: number;
  ratio: number;
}

interface Case {
  parallaxMas: number;
  errorMas: number;
  prior: Extract<Prior, { name: "edsd" }>;
}

const AGREEMENT = 1e-6;

function posteriorsPerSecond(cases: Case[]): number {
  const again = (turns: number) => {
    const start = performance.now();
    for (let turn = 0; turn < turns; turn++) for (const one of cases) distancePosterior(one);
    return (performance.now() - start) / 1000;
  };
  again(20);
  const turns = 50;
  return (turns * cases.length) / again(turns);
}

/**
 * EDSD posteriors a second here and by scipy (quad and brentq) on the same cases of the reference table and the same
 * core, one after the other. Throws when the two do not agree to 1e-6: speed counts only for the same answer.
 */
export function measurePosterior(): Measured {
  const cases = readTable<Case>("posterior_edsd").cases;
  const input = JSON.stringify(cases.map((one) => [one.parallaxMas, one.errorMas, one.prior.lengthPc]));
  const script = fileURLToPath(new URL("./posterior_scipy.py", import.meta.url));
  const scipy: { perSecond: number; quantilesKpc: number[][] } = JSON.parse(
    execFileSync("/usr/bin/python3", ["-B", script], { input, encoding: "utf8" }),
  );
  cases.forEach((one, i) => {
    const found = distancePosterior(one);
    const ours = [found.q05Pc, found.q16Pc, found.q50Pc, found.q84Pc, found.q95Pc];
    ours.forEach((pc, q) => {
      const theirs = scipy.quantilesKpc[i]![q]! * 1000;
      if (!(Math.abs(pc / theirs - 1) <= AGREEMENT)) {
        throw new Error(`${JSON.stringify(one)}: ${pc} pc here, ${theirs} pc by scipy`);
      }
    });
  });
  const value = posteriorsPerSecond(cases);
  return {
    name: "posterior.scipy",
    value,
    unit: "posteriors/s",
    baseline: scipy.perSecond,
    ratio: value / scipy.perSecond,
  };
}
