import { type Check, checked } from "#app/database/check.ts";
import { env } from "#app/env.server.ts";
import { probeBucket } from "./object-store.server.ts";

/** Whether the bucket that holds the pictures answers. */
export async function checkBucket(): Promise<Check> {
  return checked("bucket reachable", async () => {
    await probeBucket();
    return { ok: true, detail: env().S3_BUCKET };
  });
}
