import { desc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { intake } from "#app/database/schema/catalogue.ts";
import { person } from "#app/database/schema/people.ts";
import { authorise } from "#app/people/authorise.ts";
import { readSourceChoices } from "../read-record.server.ts";
import { openIntake } from "./open-intake.server.ts";
import { type IntakePlan, planIntake } from "./plan-intake.server.ts";
import type { Problem } from "./plan-row.ts";

/** Every intake, newest first. */
export async function readIntakes(actor: Actor | null) {
  authorise(actor, "intake.write");
  const rows = await db()
    .select({ intake, by: person.name })
    .from(intake)
    .innerJoin(person, eq(person.id, intake.createdBy))
    .orderBy(desc(intake.id))
    .limit(200);
  return rows.map(({ intake: one, by }) => ({
    id: one.id,
    fileName: one.fileName,
    state: one.state,
    rowCount: one.rowCount,
    createdCount: one.createdCount,
    updatedCount: one.updatedCount,
    sameCount: one.sameCount,
    badCount: one.badCount,
    createdAt: one.createdAt.toISOString(),
    by,
  }));
}

const A_PAGE = 100;
const SAMPLES = 3;

/** One intake: its columns with samples, and, once they are placed, the dry run. @throws NotFound */
export async function readIntake(actor: Actor | null, intakeId: string, problemsFrom = 0, warningsFrom = 0) {
  authorise(actor, "intake.write");
  const { intake: found, mapping, table } = await openIntake(db(), intakeId);
  const placed = found.state === "uploaded" && mapping.options.sourceId !== null;
  const plan = placed ? await planIntake(db(), table, mapping) : null;
  return {
    intake: {
      id: found.id,
      version: found.version,
      fileName: found.fileName,
      format: found.format,
      state: found.state,
      rowCount: found.rowCount,
      createdCount: found.createdCount,
      updatedCount: found.updatedCount,
      sameCount: found.sameCount,
      badCount: found.badCount,
    },
    options: mapping.options,
    columns: table.columns.map((column, at) => ({
      ...column,
      use: mapping.columns[at] ?? { meaning: "ignore" as const, unit: null, catalogue: null },
      samples: table.rows.slice(0, SAMPLES).map((row) => row.cells[at] ?? ""),
    })),
    sources: await readSourceChoices(actor),
    dryRun: plan ? summary(plan, problemsFrom, warningsFrom) : null,
  };
}

function summary(plan: IntakePlan, problemsFrom: number, warningsFrom: number) {
  const negative = [...plan.created, ...plan.updated].filter((row) =>
    row.measurements.some((one) => one.quantity === "parallax" && Number(one.value) <= 0),
  );
  return {
    created: plan.created.length,
    updated: plan.updated.length,
    same: plan.same,
    bad: plan.badRows,
    notAboveZero: negative.length,
    problems: page(plan.problems, problemsFrom),
    warnings: page(plan.warnings, warningsFrom),
  };
}

function page(all: Problem[], asked: number) {
  const from = asked < all.length ? asked : 0;
  return {
    rows: all.slice(from, from + A_PAGE),
    count: all.length,
    from,
    previous: from > 0 ? Math.max(0, from - A_PAGE) : null,
    next: from + A_PAGE < all.length ? from + A_PAGE : null,
  };
}
