import type { Check } from "#app/database/check.ts";
import { checkDatabase } from "#app/database/readiness.server.ts";
import { checkBucket } from "#app/media/bucket-readiness.server.ts";

const PATIENCE_MS = 4000;

/** GET /readyz: whether a visitor can be served now; 503 with the checks that fail when not. */
export const loader = async () => {
  const [database, bucket] = await Promise.all([
    inTime(checkDatabase(), [{ name: "database", ok: false, detail: "no answer in time" }]),
    inTime(checkBucket(), { name: "bucket reachable", ok: false, detail: "no answer in time" }),
  ]);
  const checks: Check[] = [...database, bucket];
  const ready = checks.every((check) => check.ok);
  return Response.json(
    { status: ready ? "ready" : "not ready", checks },
    { status: ready ? 200 : 503, headers: { "Cache-Control": "no-store" } },
  );
};

async function inTime<T>(answer: Promise<T>, otherwise: T): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<T>((resolve) => {
    timer = setTimeout(() => resolve(otherwise), PATIENCE_MS);
  });
  return Promise.race([answer, late]).finally(() => clearTimeout(timer));
}
