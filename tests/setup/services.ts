import { mkdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import type { TestProject } from "vitest/node";
import { startMailCatcher } from "#storage/mail-catcher.mjs";
import { startMariadb } from "#storage/mariadb.mjs";
import { VAR } from "#storage/paths.mjs";
import { startS3 } from "#storage/s3.mjs";
import { sweepTests } from "#storage/sweep.mjs";

declare module "vitest" {
  interface ProvidedContext {
    databaseServer: string;
    s3: Record<string, string>;
    mail: { url: string; folder: string };
  }
}

/** A private MariaDB, S3 stand-in and mail catcher for one run of the tests, gone with it. */
export default async function setup(project: TestProject) {
  const folder = join(VAR, `test-${process.pid}`);
  mkdirSync(folder, { recursive: true });
  await sweepTests(VAR);
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
