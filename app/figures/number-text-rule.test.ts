import { spawnSync } from "node:child_process";
import { expect, test } from "vitest";

/** What the project's linter says of a file with this text at this place. */
function lint(place: string, text: string) {
  return spawnSync("node_modules/.bin/biome", ["lint", `--stdin-file-path=${place}`], { input: text, encoding: "utf8" });
}

test.each([
  "(1.5).toFixed(2)",
  "(1.5).toPrecision(3)",
  "(1.5).toExponential()",
  '(1.5).toLocaleString("fr")',
  'new Intl.NumberFormat("en").format(1.5)',
])("outside app/figures the linter refuses %s", (expression) => {
  const code = `export const text = ${expression};\n`;
  const outside = lint("app/catalogue/planted.ts", code);
  expect(outside.status).not.toBe(0);
  expect(outside.stdout + outside.stderr).toContain("Only app/figures turns a number into text");
  const inside = lint("app/figures/planted.ts", code);
  expect(inside.stdout + inside.stderr).not.toContain("Only app/figures turns a number into text");
});
