import { join } from "node:path";
import { startMail } from "./mail.mjs";
import { startMariadb } from "./mariadb.mjs";
import { startS3 } from "./s3.mjs";

const DATABASE_GRACE_MS = 2500;
const SERVICE_GRACE_MS = 500;

/** @typedef {ReturnType<typeof import("./supervise.mjs").supervise>} Supervisor */

/** @param {string[]} names */
const given = (...names) => names.some((name) => Boolean(process.env[name]));

/** Which stand-ins this stack starts itself: those whose real service the environment does not name. */
export const wantsOwn = () => ({
  database: !given("DATABASE_URL"),
  s3: !given("S3_ENDPOINT", "S3_BUCKET", "S3_ACCESS_KEY_ID", "S3_SECRET_ACCESS_KEY"),
  mail: !given("SMTP_URL"),
});

/**
 * Starts the stand-ins that are wanted.
 * @param {Supervisor} supervisor @param {string} owner the stack's folder
 * @returns {Promise<Record<string, string>>} the variables that lead to them
 */
export async function startServices(supervisor, owner) {
  const wanted = wantsOwn();
  /** @type {Record<string, string>} */
  const environment = {};
  if (wanted.database) {
    const start = () => startMariadb(join(owner, "mariadb"), { owner });
    environment.DATABASE_URL = (await supervisor.add("database", start, DATABASE_GRACE_MS)).url;
  }
  if (wanted.s3) {
    let port = 0;
    const start = () => startS3(join(owner, "s3"), { owner, port });
    const s3 = await supervisor.add("S3 stand-in", start, SERVICE_GRACE_MS);
    port = s3.port;
    Object.assign(environment, s3.environment);
  }
  if (wanted.mail) {
    let port = 0;
    const start = () => startMail(join(owner, "mail"), { owner, port, log: join(owner, "logs", "mail.log") });
    const mail = await supervisor.add("mail catcher", start, SERVICE_GRACE_MS);
    port = mail.port;
    Object.assign(environment, mail.environment);
  }
  return environment;
}
