import { spawnSync } from "node:child_process";
import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test } from "vitest";
import { ROOT } from "./paths.mjs";

test("where the tests cannot even begin, the last line still counts a failure", () => {
  const file = join(mkdtempSync(join(tmpdir(), "alidade-ci-")), "file");
  writeFileSync(file, "");
  const env = { ...process.env, ALIDADE_VAR: join(file, "var") };
  const { status, stdout, stderr } = spawnSync(join(ROOT, ".ci", "run"), { encoding: "utf8", env });
  expect(stdout.trim().split("\n").at(-1)).toBe("0 passed, 1 failed, 0 skipped");
  expect(stderr).toContain(`This user cannot write to ${join(file, "var")}`);
  expect(status).not.toBe(0);
});
