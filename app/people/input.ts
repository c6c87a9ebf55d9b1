import { z } from "zod";
import { ROLES } from "#app/audit/actor.ts";

export const email = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, "At most 254 characters.")
  .pipe(z.email("This is not a mail address."));

/** Found in every list of stolen passwords (common practice, no source). */
const COMMONEST = new Set(["passwordpassword", "123456789012", "qwertyuiopas", "administrator", "letmeinletmein"]);

export const password = z
  .string()
  .min(12, "At least 12 characters. A sentence is easier to remember than a word.")
  .max(200, "At most 200 characters.")
  .refine(
    (text) => !COMMONEST.has(text.toLowerCase()) && new Set(text).size > 3,
    "This one is guessed first. Choose another.",
  );

export const SignIn = z.object({ email, password: z.string().min(1, "Enter your password.").max(1000) });

const roles = z.preprocess(
  (value) => (value === undefined ? [] : Array.isArray(value) ? value : [value]),
  z.array(z.enum(ROLES)).min(1, "Choose at least one role."),
);
const name = z.string().trim().min(1, "Enter a name.").max(120, "At most 120 characters.");

export const InvitePerson = z.object({ email, name, roles });
export const FirstAdmin = z.object({ email, name });
export const ChangeRoles = z.object({ personId: z.string(), version: z.coerce.number().int(), roles });
export const PersonAndVersion = z.object({ personId: z.string(), version: z.coerce.number().int() });
export const RequestReset = z.object({ email });

const twice = (fields: { password: string; again: string }) => fields.password === fields.again;
const TWICE = { path: ["again"], error: "The two passwords differ." };

export const ChoosePassword = z.object({ token: z.string(), password, again: z.string() }).refine(twice, TWICE);
export const ChangePassword = z
  .object({ current: z.string().min(1, "Enter your present password."), password, again: z.string() })
  .refine(twice, TWICE);
export const RevokeSession = z.object({ sessionId: z.string() });
