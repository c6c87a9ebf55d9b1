import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { parseInput } from "#app/parse-input.ts";
import { SignIn } from "./input.ts";
import { signIn, type Visitor } from "./sign-in.server.ts";
import { visitorOf } from "./visitor.server.ts";

/** What a successful sign-in hands to the route: the token for the cookie. */
export type SignedIn = Awaited<ReturnType<typeof signIn>>;

export const authenticator = new Authenticator<SignedIn>();

authenticator.use(
  new FormStrategy(async ({ form, request }) => {
    const visitor: Visitor = visitorOf(request);
    return signIn(parseInput(SignIn, form), visitor);
  }),
  "form",
);
