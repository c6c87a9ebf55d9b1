import { eq } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { source } from "#app/database/schema/catalogue.ts";
import { Invalid } from "#app/errors.ts";

/** @throws Invalid at the field unless the source exists, or none is named */
export async function requireSource(c: Pick<Change, "tx">, field: string, sourceId: string | null): Promise<void> {
  if (sourceId === null) return;
  const [known] = await c.tx.select({ id: source.id }).from(source).where(eq(source.id, sourceId));
  if (!known) throw new Invalid({ [field]: ["There is no such source."] });
}
