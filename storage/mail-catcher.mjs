// The SMTP catcher: takes every mail on loopback and keeps it as a file. Nothing leaves this machine.
// Run as a program: node storage/mail-catcher.mjs FOLDER PORT
import { mkdirSync } from "node:fs";
import { rename, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { SMTPServer } from "smtp-server";

const LARGEST_MAIL = 10 * 1024 * 1024;

/**
 * @param {string} folder where each mail becomes an .eml file, named by when it came
 * @param {number} [port] 0 takes a free one
 * @returns {Promise<{ port: number, close: () => Promise<void> }>}
 */
export function startMailCatcher(folder, port = 0) {
  mkdirSync(folder, { recursive: true });
  let count = 0;
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    size: LARGEST_MAIL,
    onData(stream, _session, done) {
      /** @type {Buffer[]} */
      const chunks = [];
      stream.on("data", (/** @type {Buffer} */ chunk) => chunks.push(chunk));
      stream.on("end", async () => {
        try {
          count += 1;
          const name = `${new Date().toISOString().replace(/[:.]/g, "-")}-${process.pid}-${count}`;
          // Written aside and renamed: a reader never sees half a mail.
          await writeFile(join(folder, `${name}.part`), Buffer.concat(chunks));
          await rename(join(folder, `${name}.part`), join(folder, `${name}.eml`));
          done();
        } catch (error) {
          done(/** @type {Error} */ (error));
        }
      });
    },
  });
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, "127.0.0.1", () => {
      server.off("error", reject);
      // A client that hangs up in the middle is no reason to stop.
      server.on("error", () => {});
      const address = server.server.address();
      resolve({
        port: typeof address === "object" && address ? address.port : port,
        close: () => new Promise((closed) => server.close(() => closed())),
      });
    });
  });
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const { close } = await startMailCatcher(process.argv[2] ?? "mail", Number(process.argv[3] ?? 0));
  process.on("SIGTERM", () => close().then(() => process.exit(0)));
}
