import { spawnSync } from "node:child_process";
import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join, resolve } from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";

// The project's own linter settings and rule, in a folder of its own where violations can be planted.
const folder = mkdtempSync(join(tmpdir(), "alidade-lint-"));
const RULE = "Only app/figures turns a number into text";

beforeAll(() => {
  const settings = { ...JSON.parse(readFileSync("biome.json", "utf8")), vcs: { enabled: false } };
  writeFileSync(join(folder, "biome.json"), JSON.stringify(settings));
  cpSync(".biome", join(folder, ".biome"), { recursive: true });
});

afterAll(() => rmSync(folder, { recursive: true }));

function lint(place: string, text: string) {
  const file = join(folder, place);
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, text);
  const result = spawnSync(resolve("node_modules/.bin/biome"), ["lint", place], { cwd: folder, encoding: "utf8" });
  return { status: result.status, said: result.stdout + result.stderr };
}

test.each([
  "(1.5).toFixed(2)",
  "(1.5).toFixed()",
  "globalThis.some?.toFixed(2)",
  '(1.5)["toFixed"](2)',
  "Number.prototype.toFixed.call(1.5, 2)",
  "(1.5).toPrecision(3)",
  "(1.5).toExponential()",
  '(1.5).toLocaleString("fr")',
  'new Intl.NumberFormat("en").format(1.5)',
  'new globalThis.Intl.NumberFormat("en").format(1.5)',
  '[1.5].map(Intl.NumberFormat("en").format)',
])("outside app/figures the linter refuses %s", (expression) => {
  const code = `export const text = ${expression};\n`;
  const outside = lint("app/catalogue/planted.ts", code);
  expect(outside.said).toContain(RULE);
  expect(outside.status).not.toBe(0);
  expect(lint("app/figures/planted.ts", code).said).not.toContain(RULE);
});

test.each(["app/planted.ts", "app/ui/Planted.tsx", "app/ui/figures/planted.ts", "app/routes/api/planted.ts"])(
  "the rule reaches %s",
  (place) => {
    const planted = lint(place, "export const text = (1.5).toFixed(2);\n");
    expect(planted.said).toContain(RULE);
    expect(planted.status).not.toBe(0);
  },
);

test("tests may format a number as they like", () => {
  expect(lint("app/ui/planted.test.ts", "export const text = (1.5).toFixed(2);\n").said).not.toContain(RULE);
});
