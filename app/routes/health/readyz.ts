import { type Finding, readDatabaseReadiness } from "#app/database/readiness.server.ts";
import { probeBucket } from "#app/media/object-store.server.ts";

const PATIENCE_MS = 4000;

/** GET /readyz: whether a visitor can be served now; 503 with the part that is missing when not. */
export const loader = async () => {
  const silent: Finding = { ok: false, why: "No answer in time." };
  const [database, bucket] = await Promise.all([
    inTime(readDatabaseReadiness(), { writable: silent, settings: silent, migrations: silent }),
    inTime(bucketReadiness(), silent),
  ]);
  const checks = { ...database, bucket };
  const ready = Object.values(checks).every((finding) => finding.ok);
  return Response.json(
    { status: ready ? "ready" : "not ready", checks },
    { status: ready ? 200 : 503, headers: { "Cache-Control": "no-store" } },
  );
};

async function bucketReadiness(): Promise<Finding> {
  return probeBucket().then(
    (): Finding => ({ ok: true }),
    (): Finding => ({ ok: false, why: "The bucket cannot be reached." }),
  );
}

async function inTime<T>(answer: Promise<T>, otherwise: T): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<T>((resolve) => {
    timer = setTimeout(() => resolve(otherwise), PATIENCE_MS);
  });
  return Promise.race([answer, late]).finally(() => clearTimeout(timer));
}
