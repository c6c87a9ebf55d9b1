import { spawnSync } from "node:child_process";
import { cpSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { afterEach, expect, test } from "vitest";
import { ROOT, VAR } from "./paths.mjs";

// Proves that the lint sees what it is there to see: each violation is planted in a small checkout of its own.

const folders: string[] = [];
afterEach(() => {
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true });
});

/** Cruises a checkout that holds these files. @returns its exit code and "rule: from -> to" of each violation */
function cruise(files: Record<string, string>) {
  mkdirSync(VAR, { recursive: true });
  const root = mkdtempSync(join(VAR, `test-shelf-${process.pid}-`));
  folders.push(root);
  for (const name of ["package.json", "tsconfig.json", ".dependency-cruiser.mjs"])
    cpSync(join(ROOT, name), join(root, name));
  symlinkSync(join(ROOT, "node_modules"), join(root, "node_modules"));
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(root, path)), { recursive: true });
    writeFileSync(join(root, path), text);
  }
  const program = join(ROOT, "node_modules", "dependency-cruiser", "bin", "dependency-cruise.mjs");
  const args = [program, "--config", ".dependency-cruiser.mjs", "--output-type", "json", "app"];
  const result = spawnSync(process.execPath, args, { cwd: root, encoding: "utf8", maxBuffer: 64 * 2 ** 20 });
  const asText = spawnSync(process.execPath, [program, "--config", ".dependency-cruiser.mjs", "app"], { cwd: root });
  const { summary } = JSON.parse(result.stdout) as {
    summary: { violations: { from: string; rule: { name: string } }[] };
  };
  return { code: asText.status, found: summary.violations.map(({ rule, from }) => `${rule.name}: ${from}`).sort() };
}

test("rooms that import to their left pass", () => {
  const { code, found } = cruise({
    "app/astrometry/a.ts": "export const a = 1;",
    "app/figures/b.ts": 'import { a } from "#app/astrometry/a.ts"; export const b = a;',
    "app/database/d.server.ts": 'import mysql from "mysql2/promise"; export const d = mysql;',
    "app/people/p.server.ts": 'import { d } from "#app/database/d.server.ts"; export const p = d;',
    "app/routes/r.ts": 'import { p } from "#app/people/p.server.ts"; export const loader = () => p;',
  });
  expect(found).toEqual([]);
  expect(code).toBe(0);
});

test("each violation of the shelf is found, also where only a type is imported", () => {
  const { code, found } = cruise({
    "app/astrometry/a.ts": 'import type { B } from "#app/figures/b.ts"; export type A = B;',
    "app/figures/b.ts": "export type B = number;",
    "app/figures/zod.ts": 'import { z } from "zod"; export const schema = z;',
    "app/scene/file.ts": 'import { readFileSync } from "node:fs"; export const read = readFileSync;',
    "app/raster/r.ts": 'import { a } from "#app/scene/plain.ts"; export const r = a;',
    "app/scene/plain.ts": "export const a = 1;",
    "app/people/p.server.ts": 'import { k } from "#app/kiosks/k.server.ts"; export const p = k;',
    "app/kiosks/k.server.ts": "export const k = 1;",
    "app/kiosks/look.ts": 'import { k } from "#app/kiosks/k.server.ts"; export const look = k;',
    "app/ui/Part.tsx": 'import { k } from "#app/kiosks/plain.ts"; export const Part = k;',
    "app/kiosks/plain.ts": "export const k = 1;",
    "app/routes/page.ts": 'import { eq } from "drizzle-orm"; export const loader = () => eq;',
    "app/routes/other.ts": 'import { db } from "#app/database/db.server.ts"; export const loader = () => db;',
    "app/database/db.server.ts": "export const db = 1;",
    "app/media/one.ts": 'import { two } from "./two.ts"; export const one = () => two;',
    "app/media/two.ts": 'import { one } from "./one.ts"; export const two = () => one;',
    "app/media/lost.ts": 'import { gone } from "./gone.ts"; export const lost = gone;',
    "app/media/loose.ts": 'import { helper } from "#tests/helper.ts"; export const loose = helper;',
    "tests/helper.ts": "export const helper = 1;",
  });
  expect(found).toEqual(
    [
      "app-without-tests: app/media/loose.ts",
      "browser-without-server: app/kiosks/look.ts",
      "no-cycles: app/media/one.ts",
      "no-node-in-scene: app/scene/file.ts",
      "nothing-unresolved: app/media/lost.ts",
      "packages-of-figures: app/figures/zod.ts",
      "rooms-of-astrometry: app/astrometry/a.ts",
      "rooms-of-raster: app/raster/r.ts",
      "routes-and-ui-without-database: app/routes/other.ts",
      "routes-and-ui-without-database: app/routes/page.ts",
      "shelf-astrometry: app/astrometry/a.ts",
      "shelf-people: app/people/p.server.ts",
      "ui-without-knowledge: app/ui/Part.tsx",
    ].sort(),
  );
  expect(code).toBeGreaterThan(0);
});
