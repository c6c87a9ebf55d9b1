import { mkdirSync, mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test } from "vitest";
import { buildIsCurrent, digestOfSources } from "./build.mjs";

function checkout() {
  const root = mkdtempSync(join(tmpdir(), "alidade-build-"));
  mkdirSync(join(root, "app"));
  mkdirSync(join(root, "build", "server"), { recursive: true });
  writeFileSync(join(root, "app", "a.ts"), "1");
  writeFileSync(join(root, "build", "server", "index.js"), "");
  writeFileSync(join(root, "build", "sources.sha256"), digestOfSources(root));
  return root;
}

test("a build is current until a source changes, comes or goes by another name", () => {
  const root = checkout();
  expect(buildIsCurrent(root)).toBe(true);
  writeFileSync(join(root, "app", "a.ts"), "2");
  expect(buildIsCurrent(root)).toBe(false);
  writeFileSync(join(root, "app", "a.ts"), "1");
  expect(buildIsCurrent(root)).toBe(true);
  writeFileSync(join(root, "app", "b.ts"), "");
  expect(buildIsCurrent(root)).toBe(false);
});

test("a test file is no source", () => {
  const root = checkout();
  writeFileSync(join(root, "app", "a.test.ts"), "");
  expect(buildIsCurrent(root)).toBe(true);
});

test("a build that was interrupted has no stamp and is not current", () => {
  const root = checkout();
  writeFileSync(join(root, "build", "sources.sha256"), "");
  expect(buildIsCurrent(root)).toBe(false);
});
