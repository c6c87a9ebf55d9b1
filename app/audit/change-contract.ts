import type { Transaction } from "#app/database/db.server.ts";
import type { Actor } from "./actor.ts";

/** An object whose change may move what others have signed. */
export type Touched =
  | { type: "record"; id: string }
  | { type: "source"; id: string }
  | { type: "media"; id: string }
  | { type: "exhibit"; id: string };

export interface AuditNote {
  objectType: string;
  objectId: string;
  objectName: string;
  before?: unknown;
  after?: unknown;
  note?: string;
}

/** What mail/ knows how to write; the payload is checked there. */
export interface MailPromise {
  to: string;
  subject: string;
  text: string;
}

/** What a verb does besides its own rows; everything lands in the same transaction. */
export interface Change {
  tx: Transaction;
  actor: Actor;
  /** One row of the audit log. A change without one is refused. */
  audit(note: AuditNote): void;
  /** A mail that is sent only if the change is committed. */
  mail(message: MailPromise): void;
  /** Names an object whose readers (seals) must be looked at again before the commit. */
  touch(object: Touched): void;
  /** Says that nothing needed changing: no audit row is demanded. */
  unchanged(): void;
}
