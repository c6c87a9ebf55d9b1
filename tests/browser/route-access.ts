/** Who may open an address (GET) and who may post to it. `everybody`: also without signing in. */
export interface Access {
  get: "everybody" | "staff" | readonly string[];
  /** Per intent ("" for a form without one): who gets past the door. What the verb then says is the verb's. */
  post?: Readonly<Record<string, "everybody" | "staff" | readonly string[]>>;
}

const CURATORS = ["editor", "scientist"];

/** Every address of app/routes.ts; the test fails for one that is not here. */
export const ROUTE_ACCESS: Record<string, Access> = {
  "/": { get: "everybody" },
  desk: { get: "staff" },
  stars: { get: "staff" },
  "stars/new": { get: CURATORS, post: { "": CURATORS } },
  "stars/:record": {
    get: "staff",
    post: {
      measure: CURATORS,
      adopt: CURATORS,
      confirm: ["scientist"],
      reject: CURATORS,
      vet: ["scientist"],
      unvet: ["scientist"],
    },
  },
  "stars/:record/edit": { get: CURATORS, post: { "": CURATORS } },
  sources: { get: "staff" },
  "sources/new": { get: CURATORS, post: { "": CURATORS } },
  "sources/:source": { get: "staff", post: { "": CURATORS } },
  intake: { get: CURATORS, post: { "": CURATORS } },
  "intake/:intake": { get: CURATORS, post: { map: CURATORS, apply: CURATORS, abandon: CURATORS } },
  exhibits: { get: "staff" },
  "exhibits/new": { get: ["editor"], post: { "": ["editor"] } },
  "exhibits/:exhibit": {
    get: "staff",
    post: {
      rename: ["editor"],
      "add-scene": ["editor"],
      "remove-scene": ["editor"],
      "order-scenes": ["editor"],
      "move-scene": ["editor"],
      submit: ["editor"],
      "take-back": ["editor"],
    },
  },
  "exhibits/:exhibit/scenes/:scene": {
    get: "staff",
    post: {
      "save-scene": ["editor"],
      "add-to-cast": ["editor"],
      "remove-from-cast": ["editor"],
      "label-cast": ["editor"],
      "order-cast": ["editor"],
      "move-cast": ["editor"],
      "save-words": ["editor"],
      bind: ["editor"],
      unbind: ["editor"],
      "set-media": ["editor"],
    },
  },
  "exhibits/:exhibit/scenes/:scene/still.png": { get: "staff" },
  media: { get: "staff" },
  "media/new": { get: ["editor"], post: { "": ["editor"] } },
  "media/:medium": { get: "staff", post: { "": ["editor"] } },
  reviews: { get: "staff" },
  "reviews/:exhibit": {
    get: "staff",
    post: { verify: ["scientist"], approve: ["publisher"], "send-back": ["scientist", "publisher"] },
  },
  editions: { get: "staff" },
  "editions/:exhibit": { get: "staff", post: { publish: ["publisher"], reissue: ["publisher"] } },
  kiosks: { get: "staff" },
  "kiosks/new": { get: ["admin"], post: { "": ["admin"] } },
  "kiosks/:kiosk": { get: "staff", post: { edit: ["admin"], assign: ["publisher"] } },
  people: { get: ["admin"], post: { invite: ["admin"] } },
  "people/:person": {
    get: ["admin"],
    post: { roles: ["admin"], "invite-again": ["admin"], deactivate: ["admin"], reactivate: ["admin"] },
  },
  audit: { get: "staff" },
  mail: { get: ["admin"] },
  "mail/:mail": { get: ["admin"] },
  account: { get: "staff", post: { password: "staff", revoke: "staff" } },
  "pattern-book": { get: ["admin"] },
  theme: { get: "everybody", post: { "": "everybody" } },
  "sign-in": { get: "everybody", post: { "": "everybody" } },
  "sign-out": { get: "everybody", post: { "": "everybody" } },
  "forgot-password": { get: "everybody", post: { "": "everybody" } },
  "reset-password/:token": { get: "everybody", post: { "": "everybody" } },
  "invitation/:token": { get: "everybody", post: { "": "everybody" } },
  "api/distance": { get: "everybody" },
  "api/*": { get: "everybody" },
  "feed/:exhibit.json": { get: "everybody" },
  "stills/:digest.png": { get: "everybody" },
  "pictures/:file": { get: "everybody" },
  "k/:kiosk": { get: "everybody" },
  healthz: { get: "everybody" },
  readyz: { get: "everybody" },
  "*": { get: "everybody" },
};
