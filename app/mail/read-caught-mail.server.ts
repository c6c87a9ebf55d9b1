import { readdir, readFile, stat } from "node:fs/promises";
import { join } from "node:path";
import { desc, isNotNull } from "drizzle-orm";
import { simpleParser } from "mailparser";
import { db } from "#app/database/db.server.ts";
import { outbox } from "#app/database/schema/jobs.ts";
import { env } from "#app/env.server.ts";
import { NotFound } from "#app/errors.ts";

/** One mail of the local catcher. `id` is its file's name without ".eml". */
export interface CaughtMail {
  id: string;
  to: string;
  subject: string;
  sentAt: string;
  text: string;
}

const MOST_SHOWN = 200;
const FILE_NAME = /^[\w.-]+\.eml$/;

async function parse(folder: string, file: string): Promise<CaughtMail> {
  const path = join(folder, file);
  const mail = await simpleParser(await readFile(path));
  const to = Array.isArray(mail.to) ? mail.to.map((one) => one.text).join(", ") : (mail.to?.text ?? "");
  const sentAt = mail.date ?? (await stat(path)).mtime;
  return {
    id: file.replace(/\.eml$/, ""),
    to,
    subject: mail.subject ?? "(no subject)",
    sentAt: sentAt.toISOString(),
    text: mail.text ?? "",
  };
}

/** The caught mails, newest first; null where mail goes to a real server and nothing is caught. */
export async function readCaughtMail(): Promise<CaughtMail[] | null> {
  const folder = env().MAIL_CATCHER_DIR;
  if (!folder) return null;
  const files = (await readdir(folder).catch(() => [])).filter((file) => FILE_NAME.test(file));
  const dated = await Promise.all(files.map(async (file) => ({ file, at: (await stat(join(folder, file))).mtimeMs })));
  dated.sort((a, b) => b.at - a.at || b.file.localeCompare(a.file));
  return Promise.all(dated.slice(0, MOST_SHOWN).map(({ file }) => parse(folder, file)));
}

/** @throws NotFound when there is no such mail, or none is caught here. */
export async function readOneCaughtMail(id: string): Promise<CaughtMail> {
  const folder = env().MAIL_CATCHER_DIR;
  const file = `${id}.eml`;
  if (!folder || !FILE_NAME.test(file)) throw new NotFound("There is no such mail.");
  return parse(folder, file).catch(() => {
    throw new NotFound("There is no such mail.");
  });
}

/** Mails that could not be sent yet, with why. */
export async function readTroubledMail() {
  return db()
    .select({
      id: outbox.id,
      createdAt: outbox.createdAt,
      attempts: outbox.attempts,
      lastError: outbox.lastError,
      doneAt: outbox.doneAt,
      failedAt: outbox.failedAt,
      availableAt: outbox.availableAt,
    })
    .from(outbox)
    .where(isNotNull(outbox.lastError))
    .orderBy(desc(outbox.id))
    .limit(50);
}
