import { NotFound } from "#app/errors.ts";
import { answered } from "#app/http.server.ts";
import type { Route } from "./+types/not-found";

/** Every address that nothing else answers. */
export const loader = answered(({ request }: Route.LoaderArgs): null => {
  throw new NotFound(`There is nothing at ${new URL(request.url).pathname}.`);
});

export const action = loader;

export default function Nothing() {
  return null;
}
