import { and, eq, isNull } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { seal } from "#app/database/schema/review.ts";
import type { Moved } from "./compare-content.ts";

/** Ends every standing seal of an exhibit. Nothing is deleted: who signed what stays readable. */
export async function voidStandingSeals(c: Change, exhibitId: string, reason: VoidReason): Promise<void> {
  await c.tx
    .update(seal)
    .set({ voidedAt: new Date(), voidReason: reason })
    .where(and(eq(seal.exhibitId, exhibitId), isNull(seal.voidedAt)));
}

export interface VoidReason {
  /** "moved": the content changed; "returned": a reviewer or the editor stopped the round. */
  why: "moved" | "returned";
  by: string;
  note: string | null;
  moved: Moved[];
}
