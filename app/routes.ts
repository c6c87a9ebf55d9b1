import { index, layout, type RouteConfig, route } from "@react-router/dev/routes";

/** The map of the house: every address, in the order a person meets them. */
export default [
  index("routes/home.ts"),
  // -- the office: signed-in people (routes/office.tsx checks who enters) --
  layout("routes/office.tsx", [
    route("desk", "routes/desk/desk.tsx"),
    route("stars", "routes/stars/stars.tsx"),
    route("stars/new", "routes/stars/new.tsx"),
    route("stars/:record", "routes/stars/star.tsx"),
    route("stars/:record/edit", "routes/stars/edit.tsx"),
    route("sources", "routes/sources/sources.tsx"),
    route("sources/new", "routes/sources/new.tsx"),
    route("sources/:source", "routes/sources/source.tsx"),
    // intake
    route("exhibits", "routes/exhibits/exhibits.tsx"),
    route("exhibits/new", "routes/exhibits/new.tsx"),
    route("exhibits/:exhibit", "routes/exhibits/exhibit.tsx"),
    route("exhibits/:exhibit/scenes/:scene", "routes/exhibits/scene.tsx"),
    route("exhibits/:exhibit/scenes/:scene/still.png", "routes/exhibits/still.ts"),
    route("media", "routes/media/media.tsx"),
    route("media/new", "routes/media/new.tsx"),
    route("media/:medium", "routes/media/medium.tsx"),
    route("reviews", "routes/reviews/reviews.tsx"),
    route("reviews/:exhibit", "routes/reviews/review.tsx"),
    route("editions", "routes/editions/editions.tsx"),
    route("editions/:exhibit", "routes/editions/exhibit-editions.tsx"),
    route("kiosks", "routes/kiosks/kiosks.tsx"),
    route("kiosks/new", "routes/kiosks/new.tsx"),
    route("kiosks/:kiosk", "routes/kiosks/kiosk.tsx"),
    route("people", "routes/people/people.tsx"),
    route("people/:person", "routes/people/person.tsx"),
    route("audit", "routes/audit/audit.tsx"),
    route("mail", "routes/mail/mails.tsx"),
    route("mail/:mail", "routes/mail/mail.tsx"),
    route("account", "routes/account/account.tsx"),
    route("pattern-book", "routes/pattern-book.tsx"),
  ]),
  route("theme", "routes/theme.ts"),
  // -- signing in --
  route("sign-in", "routes/account/sign-in.tsx"),
  route("sign-out", "routes/account/sign-out.ts"),
  route("forgot-password", "routes/account/forgot-password.tsx"),
  route("reset-password/:token", "routes/account/reset-password.tsx"),
  route("invitation/:token", "routes/account/invitation.tsx"),
  // -- api --
  route("api/distance", "routes/api/distance.ts"),
  route("api/*", "routes/api/not-found.ts"),
  // -- feeds, pictures, kiosks: anybody --
  route("feed/:exhibit.json", "routes/feed/feed.ts"),
  route("stills/:digest.png", "routes/feed/still.ts"),
  route("pictures/:file", "routes/feed/picture.ts"),
  route("k/:kiosk", "routes/kiosk/kiosk.tsx"),
  // -- health --
  route("healthz", "routes/health/healthz.ts"),
  route("readyz", "routes/health/readyz.ts"),
  route("*", "routes/not-found.tsx"),
] satisfies RouteConfig;
