import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { recordColumns } from "./create-record.server.ts";
import { closeRecord, openRecord, UNVETTED } from "./open-record.server.ts";
import type { EditRecord } from "./record-input.ts";
import { readNames, writeNames } from "./record-names.server.ts";
import { requireSource } from "./require-source.server.ts";

/** Names, identifiers, kind and position. A vetted record is a draft again. @throws Conflict, Invalid, NotFound */
export async function editRecord(actor: Actor | null, input: z.output<typeof EditRecord>): Promise<void> {
  authorise(actor, "record.write");
  await change(actor, "catalogue.edit-record", async (c) => {
    const opened = await openRecord(c, input.recordId);
    const columns = recordColumns(input);
    const kept = await readNames(c.tx, [opened.id]);
    const before = {
      ...pick(opened, columns),
      otherNames: kept.names.map(({ language, name }) => ({ language, name })),
      identifiers: kept.identifiers.map(({ catalogue, value }) => ({ catalogue, value })),
    };
    const after = { ...columns, otherNames: input.otherNames, identifiers: input.identifiers };
    if (JSON.stringify(before) === JSON.stringify(after)) return c.unchanged();
    await requireSource(c, "positionSourceId", input.positionSourceId);
    await writeNames(c, opened.id, input);
    await closeRecord(c, opened, input.version, { ...columns, ...UNVETTED }, { before, after });
  });
}

/** The same keys as `like`, in the same order. */
function pick<T extends object>(from: Record<string, unknown>, like: T): Record<string, unknown> {
  return Object.fromEntries(Object.keys(like).map((key) => [key, from[key]]));
}
