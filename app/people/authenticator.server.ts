import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { parseInput } from "#app/parse-input.ts";
import { SignIn } from "./input.ts";
import { signIn } from "./sign-in.server.ts";
import type { Visitor } from "./visitor.server.ts";

/** What a successful sign-in hands to the route: the token for the cookie. */
export type SignedIn = Awaited<ReturnType<typeof signIn>>;

/** Signs in by the form of a request. @throws what parseInput and signIn throw */
export function authenticateForm(request: Request, visitor: Visitor): Promise<SignedIn> {
  const authenticator = new Authenticator<SignedIn>();
  authenticator.use(new FormStrategy(({ form }) => signIn(parseInput(SignIn, form), visitor)), "form");
  return authenticator.authenticate("form", request);
}
