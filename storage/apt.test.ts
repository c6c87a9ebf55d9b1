import type { ChildProcess } from "node:child_process";
import { once } from "node:events";
import { existsSync, mkdtempSync, readFileSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test } from "vitest";
import { installDebianPackages } from "./apt.mjs";

const step = async (child: ChildProcess) => (await once(child, "exit"))[0] as number;

/** A machine whose apt-get only writes down what it was asked, and whether services were forbidden then. */
function machine(exitCode = 0) {
  const folder = mkdtempSync(join(tmpdir(), "alidade-apt-"));
  const policy = join(folder, "policy-rc.d");
  const apt = join(folder, "apt-get");
  const log = join(folder, "log");
  writeFileSync(
    apt,
    `#!/bin/sh\necho "$* policy=$(sh ${policy}; echo $?)" >> ${log}\n[ "$1" = update ] || exit ${exitCode}\n`,
    { mode: 0o755 },
  );
  return { policy, apt, asked: () => readFileSync(log, "utf8").trim().split("\n"), folder };
}

test("packages are installed without recommendations, and their services are kept from starting meanwhile", async () => {
  const { policy, apt, asked, folder } = machine();
  await installDebianPackages(["mariadb-server"], { owner: folder, step }, { apt, policy });
  expect(asked()).toEqual([
    "update -qq policy=101",
    "install -y -qq --no-install-recommends mariadb-server policy=101",
  ]);
  expect(existsSync(policy)).toBe(false);
});

test("an administrator's own policy stays as it is", async () => {
  const { policy, apt, folder } = machine();
  writeFileSync(policy, "exit 104\n");
  await installDebianPackages(["chromium"], { owner: folder, step }, { apt, policy });
  expect(readFileSync(policy, "utf8")).toBe("exit 104\n");
});

test("a failed installation says what to run by hand, and forbids nothing any longer", async () => {
  const { policy, apt, folder } = machine(100);
  await expect(installDebianPackages(["chromium"], { owner: folder, step }, { apt, policy })).rejects.toThrow(
    "Installing chromium failed (apt-get ended with 100). Run it by hand to see why: apt-get update && apt-get install -y --no-install-recommends chromium",
  );
  expect(existsSync(policy)).toBe(false);
});

test("a machine without apt-get is told what is missing", async () => {
  const { policy, folder } = machine();
  await expect(installDebianPackages(["chromium"], { owner: folder, step }, { apt: null, policy })).rejects.toThrow(
    "there is no apt-get here",
  );
});
