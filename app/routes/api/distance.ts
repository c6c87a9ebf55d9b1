import { answerDistance } from "#app/catalogue/answer-distance.ts";
import { DistanceQuery, queryParameters } from "#app/catalogue/distance-query.ts";
import { answeredApi, problem } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";

/** GET /api/distance?parallax=&error=&prior=&length=&limit= : mas and pc in, DistanceReply out. Asks nobody who they are. */
export const loader = answeredApi(({ request }: { request: Request }) => {
  const { searchParams } = new URL(request.url);
  return Response.json(answerDistance(parseInput(DistanceQuery, queryParameters(searchParams))));
});

/** There is nothing to change here. */
export const action = () =>
  problem(405, "Only GET is answered here", "Ask with GET and the parameters in the address.", [], {
    Allow: "GET, HEAD",
  });
