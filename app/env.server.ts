import { z } from "zod";

/** The environment, parsed once. A wrong or missing variable stops the program with its name. */
const url = (protocols: string[]) =>
  z.string().refine(
    (text) => {
      try {
        return protocols.includes(new URL(text).protocol);
      } catch {
        return false;
      }
    },
    { error: `must be a URL that starts with ${protocols.map((p) => `${p}//`).join(" or ")}` },
  );

const Environment = z.object({
  NODE_ENV: z.enum(["development", "production", "test"]).default("production"),
  DATABASE_URL: url(["mysql:", "mariadb:"]),
  S3_ENDPOINT: url(["http:", "https:"]),
  S3_REGION: z.string().min(1).default("us-east-1"),
  S3_BUCKET: z.string().min(3, "must have at least 3 letters"),
  S3_ACCESS_KEY_ID: z.string().min(1),
  S3_SECRET_ACCESS_KEY: z.string().min(1),
  SMTP_URL: url(["smtp:", "smtps:"]),
  MAIL_FROM: z.string().min(3).default("Alidade <alidade@tern-point.example>"),
  SESSION_SECRET: z.string().min(32, "must have at least 32 characters"),
  /** Printed at the foot of the office. */
  CENTRE_NAME: z.string().min(1).default("Tern Point Science Centre"),
  PUBLIC_URL: url(["http:", "https:"]).transform((text) => text.replace(/\/+$/, "")),
  /** Only in local mode: the folder in which the mail catcher keeps what was sent. */
  MAIL_CATCHER_DIR: z.string().optional(),
  /** Behind how many proxies we stand: how far X-Forwarded-For is believed. */
  TRUSTED_PROXIES: z.coerce.number().int().min(0).default(0),
});

export type Env = z.infer<typeof Environment>;

/** @throws Error that names each variable that is missing or wrong. */
export function parseEnvironment(source: Record<string, string | undefined>): Env {
  const parsed = Environment.safeParse(source);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => {
    const name = issue.path.join(".");
    return source[name] === undefined ? `${name} is not set` : `${name} ${issue.message}`;
  });
  throw new Error(`The environment is not complete: ${lines.join("; ")}. See .env.example.`);
}

let parsed: Env | undefined;

export function env(): Env {
  parsed ??= parseEnvironment(process.env);
  return parsed;
}
