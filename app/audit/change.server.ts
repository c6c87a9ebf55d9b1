import { CHANGED_SINCE_READ, DEADLOCK, errorNumber } from "#app/database/database-error.ts";
import { db, type Transaction } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { outbox } from "#app/database/schema/jobs.ts";
import { Conflict } from "#app/errors.ts";
import type { Actor } from "./actor.ts";
import type { AuditNote, Change, MailPromise, Touched } from "./change-contract.ts";
import { applyConsequences } from "./consequences.server.ts";

export type { AuditNote, Change, MailPromise };

const ATTEMPTS = 4;

/**
 * Runs one verb's change in one transaction together with its audit rows, its outbox rows and its consequences.
 * A deadlock or a row that changed under the snapshot runs the whole work again (it reads everything anew, and what
 * the person saw is guarded by version numbers).
 */
export async function change<T>(actor: Actor, verb: string, work: (change: Change) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await db().transaction((tx) => once(tx, actor, verb, work));
    } catch (error) {
      const number = errorNumber(error);
      if (number !== DEADLOCK && number !== CHANGED_SINCE_READ) throw error;
      if (attempt === ATTEMPTS) {
        throw new Conflict("Others are changing the same thing right now. Nothing of yours was written.", {
          cause: error,
        });
      }
    }
  }
}

async function once<T>(tx: Transaction, actor: Actor, verb: string, work: (change: Change) => Promise<T>): Promise<T> {
  const notes: AuditNote[] = [];
  const mails: MailPromise[] = [];
  const touched: Touched[] = [];
  let unchanged = false;
  const current: Change = {
    tx,
    actor,
    audit: (note) => void notes.push(note),
    mail: (message) => void mails.push(message),
    touch: (object) => void touched.push(object),
    unchanged: () => {
      unchanged = true;
    },
  };
  const result = await work(current);
  if (notes.length === 0 && !unchanged) throw new Error(`${verb} changed something without an audit row`);
  await applyConsequences(current, touched);
  await writeAudit(tx, actor, verb, notes);
  await promiseMails(tx, mails);
  return result;
}

async function writeAudit(tx: Transaction, actor: Actor, verb: string, notes: AuditNote[]): Promise<void> {
  if (notes.length === 0) return;
  const at = new Date();
  const rows = notes.map((note) => ({
    at,
    personId: actor.personId || null,
    personName: actor.name,
    verb,
    objectType: note.objectType,
    objectId: note.objectId,
    objectName: note.objectName.slice(0, 200),
    before: note.before ?? null,
    after: note.after ?? null,
    note: note.note?.slice(0, 1000) ?? null,
    requestId: actor.requestId,
  }));
  for (let from = 0; from < rows.length; from += 500) await tx.insert(auditEntry).values(rows.slice(from, from + 500));
}

async function promiseMails(tx: Transaction, mails: MailPromise[]): Promise<void> {
  if (mails.length === 0) return;
  const now = new Date();
  await tx.insert(outbox).values(mails.map((payload) => ({ kind: "mail" as const, payload, availableAt: now })));
}
