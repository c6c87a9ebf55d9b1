import nodemailer, { type Transporter } from "nodemailer";
import { z } from "zod";
import { env } from "#app/env.server.ts";

const Message = z.object({ to: z.email(), subject: z.string().min(1).max(200), text: z.string().min(1) });

let transport: Transporter | undefined;

function transporter(): Transporter {
  if (transport) return transport;
  const url = new URL(env().SMTP_URL);
  const secure = url.protocol === "smtps:";
  const local = ["127.0.0.1", "localhost", "[::1]"].includes(url.hostname);
  transport = nodemailer.createTransport({
    host: url.hostname,
    port: Number(url.port || (secure ? 465 : 25)),
    secure,
    ignoreTLS: local && !secure,
    requireTLS: !local && !secure && Boolean(url.username),
    auth: url.username ? { user: decodeURIComponent(url.username), pass: decodeURIComponent(url.password) } : undefined,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 20_000,
  });
  return transport;
}

/** Sends one promised mail. The outbox row's id is its Message-ID, so that a second sending is recognised as such. */
export async function sendMail(payload: unknown, id: string): Promise<void> {
  const message = Message.parse(payload);
  const domain = new URL(env().PUBLIC_URL).hostname;
  await transporter().sendMail({ from: env().MAIL_FROM, messageId: `<${id}@${domain}>`, ...message });
}

export function closeMail(): void {
  transport?.close();
  transport = undefined;
}
