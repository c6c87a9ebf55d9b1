import { mkdirSync, readdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import type { TestProject } from "vitest/node";
import { startMailCatcher } from "#storage/mail-catcher.mjs";
import { startMariadb } from "#storage/mariadb.mjs";
import { VAR } from "#storage/paths.mjs";
import { birthOf, endMarked } from "#storage/processes.mjs";
import { startS3 } from "#storage/s3.mjs";

declare module "vitest" {
  interface ProvidedContext {
    databaseServer: string;
    s3: Record<string, string>;
    mail: { url: string; folder: string };
  }
}

/** What runs of the tests that were killed left behind. */
async function sweep() {
  for (const name of readdirSync(VAR)) {
    const pid = Number(/^test-(\d+)$/.exec(name)?.[1]);
    if (!pid || birthOf(pid) !== null) continue;
    await endMarked(join(VAR, name), 500);
    rmSync(join(VAR, name), { recursive: true, force: true });
  }
}

/** A private MariaDB, S3 stand-in and mail catcher for one run of the tests, gone with it. */
export default async function setup(project: TestProject) {
  const folder = join(VAR, `test-${process.pid}`);
  mkdirSync(folder, { recursive: true });
  await sweep();
  const mariadb = await startMariadb(join(folder, "mariadb"), { durable: false, owner: folder });
  const s3 = await startS3(join(folder, "s3"), { owner: folder });
  const mailFolder = join(folder, "mail");
  const mail = await startMailCatcher(mailFolder);
  project.provide("databaseServer", mariadb.url);
  project.provide("s3", s3.environment);
  project.provide("mail", { url: `smtp://127.0.0.1:${mail.port}`, folder: mailFolder });
  return async () => {
    await Promise.all([mariadb.stop(), s3.stop(), mail.close()]);
    rmSync(folder, { recursive: true, force: true });
  };
}
