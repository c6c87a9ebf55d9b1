import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { aptFailed } from "./messages.mjs";
import { findProgram } from "./paths.mjs";
import { spawnChild } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

const POLICY_FILE = "/usr/sbin/policy-rc.d";
const OURS = "# Written by Alidade while it installs packages; safe to remove.";

/**
 * Installs Debian packages. The services that come with them are not started: Alidade runs its own, elsewhere.
 * @param {string[]} packages
 * @param {import("./bootstrap.mjs").Run} run
 * @param {{ apt?: string | null, policy?: string }} [machine] for the tests
 */
export async function installDebianPackages(
  packages,
  { owner, step },
  { apt = findProgram("apt-get"), policy = POLICY_FILE } = {},
) {
  if (!apt) throw new Refusal(aptFailed(packages, "there is no apt-get here"));
  const env = { DEBIAN_FRONTEND: "noninteractive" };
  const forbidden = forbidServices(policy);
  try {
    // A list that cannot be refreshed may still be good enough; the install says if it is not.
    await step(spawnChild(apt, ["update", "-qq"], { owner, env }));
    const code = await step(
      spawnChild(apt, ["install", "-y", "-qq", "--no-install-recommends", ...packages], { owner, env }),
    );
    if (code !== 0) throw new Refusal(aptFailed(packages, `apt-get ended with ${code ?? "a signal"}`));
    await keepFromStartingAtBoot(packages, { owner, step });
  } finally {
    if (forbidden) rmSync(policy, { force: true });
  }
}

/** @param {string} policy @returns {boolean} whether the file is ours to remove; an administrator's own stays as it is */
function forbidServices(policy) {
  if (existsSync(policy) && !readFileSync(policy, "utf8").includes(OURS)) return false;
  writeFileSync(policy, `#!/bin/sh\n${OURS}\nexit 101\n`, { mode: 0o755 });
  return true;
}

/** @param {string[]} packages @param {import("./bootstrap.mjs").Run} run */
async function keepFromStartingAtBoot(packages, { owner, step }) {
  if (!packages.includes("mariadb-server") || !existsSync("/run/systemd/system")) return;
  const systemctl = findProgram("systemctl");
  if (systemctl) await step(spawnChild(systemctl, ["disable", "--now", "mariadb"], { owner }));
}
