import { index, layout, prefix, type RouteConfig, route } from "@react-router/dev/routes";

/** The map of the house: every address, in the order a person meets them. */
export default [
  // -- the office: signed-in people (routes/office.tsx checks who enters) --
  layout("routes/office.tsx", [
    // desk
    // stars, sources, intake
    // exhibits, media
    // reviews, editions, kiosks
    // people, audit, mail, account, pattern book
    route("pattern-book", "routes/pattern-book.tsx"),
  ]),
  route("theme", "routes/theme.ts"),
  // -- signing in --
  // -- api --
  // -- feeds, pictures, kiosks: anybody --
  // -- health --
] satisfies RouteConfig;
