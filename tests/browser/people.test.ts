import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import type { Page } from "playwright-core";
import { expect, inject, test } from "vitest";
import { expectNoSeriousAxe, newPage } from "./browser.ts";
import { signInAs } from "./sign-in-as.ts";

// How somebody comes into the house, without any script in the browser and then with the keyboard alone.

const REFUSED = { expected: [/status of 4\d\d/] };

/** The path of the one-time link in the newest mail to an address. */
async function linkTo(email: string, kind: "invitation" | "reset-password", not = ""): Promise<string> {
  const folder = inject("mailFolder");
  for (let tries = 0; tries < 150; tries += 1) {
    const mails = readdirSync(folder)
      .filter((file) => file.endsWith(".eml"))
      // Quoted-printable breaks long lines with "=".
      .map((file) => readFileSync(join(folder, file), "utf8").replace(/=\r?\n/g, ""))
      .filter((mail) => mail.includes(`To: ${email}`));
    const links = mails.map((mail) => new RegExp(`/${kind}/[\\w-]{43}`).exec(mail)?.[0]).filter(Boolean);
    const link = links.find((one) => one !== not);
    if (link) return link;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error(`No mail with a link of kind ${kind} came to ${email}.`);
}

async function choose(page: Page, password: string, again = password): Promise<void> {
  await page.getByLabel("New password").fill(password);
  await page.getByLabel("The same again").fill(again);
  await page.getByRole("button", { name: "Keep this password" }).click();
}

async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.getByLabel("Mail address").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
}

test("without scripts: invited, in by the link, out, in again by a forgotten password", async () => {
  const email = "wren@tern-point.example";
  const admin = await newPage({ javaScriptEnabled: false, ...REFUSED });
  await signInAs(admin, "admin");
  await admin.goto("/people");
  await admin.getByLabel("Name").fill("Wren Adeyemi");
  await admin.getByLabel("Mail address").fill("not an address");
  await admin.getByRole("checkbox", { name: "curator" }).check();
  await admin.getByRole("checkbox", { name: "publisher" }).check();
  await admin.getByRole("button", { name: "Send the invitation" }).click();
  // Refused: everything that was typed and ticked is still there.
  await admin.getByRole("alert").getByText("This is not a mail address.").waitFor();
  expect(await admin.getByLabel("Name").inputValue()).toBe("Wren Adeyemi");
  for (const role of ["curator", "publisher"]) {
    expect(await admin.getByRole("checkbox", { name: role }).isChecked(), role).toBe(true);
  }
  expect(await admin.getByRole("checkbox", { name: "administrator" }).isChecked()).toBe(false);
  await admin.getByLabel("Mail address").fill(email);
  await admin.getByRole("button", { name: "Send the invitation" }).click();
  await admin.getByText("The invitation is on its way.").waitFor();

  const wren = await newPage({ javaScriptEnabled: false, ...REFUSED });
  const invitation = await linkTo(email, "invitation");
  // A mail scanner that follows links does no harm.
  await fetch(inject("baseUrl") + invitation);
  await wren.goto(invitation);
  await choose(wren, "short", "other");
  await wren.getByRole("alert").getByText("The two passwords differ.").waitFor();
  expect(await wren.content()).not.toContain('value="short"');
  await choose(wren, "a tern above the estuary");
  await wren.getByText("Your password is kept.").waitFor();
  await wren.goto(invitation);
  await wren.getByRole("heading", { name: "This link opens nothing any more" }).waitFor();
  await wren.getByRole("link", { name: "Sign in" }).click();
  await signIn(wren, email, "a tern above the estuary");
  await wren.getByRole("heading", { level: 1 }).waitFor();
  await wren.goto("/account");
  await wren.getByRole("main").getByText("curator, publisher").waitFor();
  await wren.getByRole("button", { name: "Sign out" }).first().click();
  await wren.getByText("You are signed out.").waitFor();

  await wren.getByRole("link", { name: "Forgotten the password?" }).click();
  await wren.getByLabel("Mail address").fill(email);
  await wren.getByRole("button", { name: "Send the link" }).click();
  await wren.getByText("If there is an account with this address").waitFor();
  await wren.goto(await linkTo(email, "reset-password"));
  await choose(wren, "two terns above the estuary");
  await signIn(wren, email, "two terns above the estuary");
  await wren.waitForURL(/\/desk/);
});

test("with the keyboard alone: signed in, sent back to the page that was asked for, another session ended", async () => {
  const elsewhere = await newPage();
  await signInAs(elsewhere, "publisher");
  const page = await newPage(REFUSED);
  await page.goto("/account");
  await page.waitForURL(/\/sign-in\?to=%2Faccount/);
  await page.getByRole("button", { name: "Sign in" }).waitFor();
  const focusOn = async (name: RegExp) => {
    for (let tabs = 0; tabs < 60; tabs += 1) {
      await page.keyboard.press("Tab");
      const words = await page.evaluate(() => {
        const element = document.activeElement;
        const label = element instanceof HTMLInputElement ? element.labels?.[0] : element;
        return label?.textContent ?? "";
      });
      if (name.test(words)) return;
    }
    throw new Error(`The focus never comes to ${name}.`);
  };
  await focusOn(/^Mail address/);
  await page.keyboard.type("maud@tern-point.example");
  await focusOn(/^Password/);
  await page.keyboard.type("not hers");
  await page.keyboard.press("Enter");
  const alert = page.getByRole("alert");
  await alert.waitFor();
  // The refusal takes the focus, so that it is read and the fields are next.
  expect(await alert.evaluate((element) => element === document.activeElement)).toBe(true);
  await focusOn(/^Password/);
  await page.keyboard.press("Control+a");
  await page.keyboard.type("tern-point-demo");
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/account$/);
  await expectNoSeriousAxe(page);
  await focusOn(/^End it/);
  await page.keyboard.press("Enter");
  await page.getByText("That session has ended.").waitFor();
  await elsewhere.goto("/account");
  await elsewhere.waitForURL(/\/sign-in/);
});

test("an administrator who is the last cannot close their own account, and is told why", async () => {
  const page = await newPage({ ...REFUSED });
  const { name } = await signInAs(page, "admin");
  await page.goto("/people");
  await page.getByRole("main").getByRole("link", { name }).click();
  await page.getByRole("button", { name: "Close the account" }).click();
  await page.getByRole("alert").getByText("This is the last active administrator.").waitFor();
  await expectNoSeriousAxe(page);
});
