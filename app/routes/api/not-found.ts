import { NotFound } from "#app/errors.ts";
import { answeredApi } from "#app/http.server.ts";

/** Every address under /api that nothing else answers, by any method. */
export const loader = answeredApi(() => {
  throw new NotFound("There is no such address in this API.");
});

export const action = loader;
