import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { ROOT } from "./paths.mjs";
import { freePort } from "./ports.mjs";
import { endChild, hasEnded, spawnChild } from "./processes.mjs";

export const BUCKET = "alidade-media";

/**
 * Starts the S3 stand-in on loopback. Its data is plain files under `folder`.
 * @param {string} folder
 * @param {{ owner?: string, port?: number }} [options] owner: the stack whose child it is
 */
export async function startS3(folder, { owner = folder, port: wantedPort = 0 } = {}) {
  mkdirSync(join(folder, "data"), { recursive: true });
  const port = await freePort(wantedPort);
  const child = spawnChild(
    process.execPath,
    [
      // s3rver signs with digests that OpenSSL 3 calls legacy.
      "--openssl-legacy-provider",
      join(ROOT, "node_modules", "s3rver", "bin", "s3rver.js"),
      "--directory",
      join(folder, "data"),
      "--address",
      "127.0.0.1",
      "--port",
      String(port),
      "--configure-bucket",
      BUCKET,
    ],
    { owner, log: join(folder, "s3.log") },
  );
  const endpoint = `http://127.0.0.1:${port}`;
  for (let tries = 0; tries < 200; tries += 1) {
    if (hasEnded(child)) throw new Error(`The S3 stand-in did not start; see ${join(folder, "s3.log")}.`);
    if (
      await fetch(endpoint).then(
        () => true,
        () => false,
      )
    )
      break;
    await pause(50);
  }
  return {
    process: child,
    port,
    environment: {
      S3_ENDPOINT: endpoint,
      S3_REGION: "us-east-1",
      S3_BUCKET: BUCKET,
      S3_ACCESS_KEY_ID: "S3RVER",
      S3_SECRET_ACCESS_KEY: "S3RVER",
    },
    stop: () => endChild(child, 500),
  };
}
