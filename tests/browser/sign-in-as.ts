import { readFileSync } from "node:fs";
import type { Page } from "playwright-core";
import { inject } from "vitest";

/** A person of the demo, as `npm start` prints them. */
export interface DemoAccount {
  email: string;
  role: string;
  name: string;
}

/** The accounts and their password, read from what the demo printed: what is not printed, nobody could use. */
export function demoAccounts(): { accounts: DemoAccount[]; password: string } {
  const text = readFileSync(inject("accountsFile"), "utf8");
  const accounts = [...text.matchAll(/^ {2}(\S+@\S+) +(\S+) +(.+)$/gm)].map(([, email = "", role = "", name = ""]) => ({
    email,
    role,
    name,
  }));
  return { accounts, password: /password of all: (\S+)\)/.exec(text)?.[1] ?? "" };
}

/** Signs a page in as the first person of the demo with a role (or as the nth), through the form. */
export async function signInAs(page: Page, role: string, nth = 0): Promise<DemoAccount> {
  const { accounts, password } = demoAccounts();
  const account = accounts.filter((each) => each.role === role)[nth];
  if (!account) throw new Error(`The demo printed no account with the role ${role}.`);
  await page.goto("/sign-in");
  await page.getByLabel("Mail address").fill(account.email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL((url) => url.pathname !== "/sign-in");
  return account;
}
