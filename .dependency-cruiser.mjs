// The shelf of the house as data. A room imports rooms to its left, never to its right; dependency-cruiser holds it.

const PURE = ["astrometry", "figures", "scene", "raster", "stage"];
const OFFICE = [
  "database",
  "audit",
  "jobs",
  "mail",
  "people",
  "media",
  "catalogue",
  "exhibits",
  "review",
  "editions",
  "kiosks",
  "workshop",
];
const SHELF = [...PURE, ...OFFICE, "routes"];

/** What the pure rooms may import of other rooms. */
const ROOMS_OF = {
  astrometry: [],
  figures: ["astrometry"],
  scene: ["astrometry", "figures"],
  raster: [],
  stage: ["astrometry", "figures", "scene", "raster"],
};

/** What the pure rooms may import from npm. Rooms that are not named here may import what they need. */
const PACKAGES_OF = {
  astrometry: [],
  figures: [],
  scene: ["zod"],
  raster: ["three", "opentype.js", "@types/three", "@types/opentype.js"],
};

// A test may look over the fence: it proves how rooms work together.
const IS_TEST = "\\.test\\.tsx?$";
const FROM_NPM = ["npm", "npm-dev", "npm-optional", "npm-peer", "npm-bundled", "npm-no-pkg", "npm-unknown"];
// Pages reach the server only through the modules that the framework takes out of what it sends to the browser.
const ROUTE_MODULES = "^app/(root|entry\\.server)\\.tsx$|^app/routes/|^app/context\\.server\\.ts$";

const room = (name) => `^app/${name}/`;
const rooms = (names) => `^app/(${names.join("|")})/`;
const escaped = (name) => name.replaceAll(".", "\\.");

const shelf = SHELF.slice(0, -1).map((name, place) => ({
  name: `shelf-${name}`,
  comment: `${name} may not import rooms to its right on the shelf, nor ui.`,
  severity: "error",
  from: { path: room(name), pathNot: IS_TEST },
  // The stage shows itself in the browser; what it shows has no parts of the office in it.
  to: { path: rooms([...SHELF.slice(place + 1), "ui"]) },
}));

const pureRooms = Object.entries(ROOMS_OF).map(([name, allowed]) => ({
  name: `rooms-of-${name}`,
  comment: `${name} imports ${allowed.length > 0 ? `only ${allowed.join(", ")}` : "no other room"}, and none of the loose files of app/.`,
  severity: "error",
  from: { path: room(name), pathNot: IS_TEST },
  to: { path: "^app/", pathNot: rooms([name, ...allowed]) },
}));

const purePackages = Object.entries(PACKAGES_OF).flatMap(([name, allowed]) => [
  {
    name: `packages-of-${name}`,
    comment: `${name} imports ${allowed.length > 0 ? `only ${allowed.join(", ")}` : "nothing"} from npm.`,
    severity: "error",
    from: { path: room(name), pathNot: IS_TEST },
    to: {
      dependencyTypes: FROM_NPM,
      ...(allowed.length > 0 ? { pathNot: `node_modules/(${allowed.map(escaped).join("|")})/` } : {}),
    },
  },
  {
    name: `no-node-in-${name}`,
    comment: `${name} runs in browsers and in Node alike, so it imports nothing of Node.`,
    severity: "error",
    from: { path: room(name), pathNot: IS_TEST },
    to: { dependencyTypes: ["core"] },
  },
]);

export default {
  forbidden: [
    ...shelf,
    ...pureRooms,
    ...purePackages,
    {
      name: "no-cycles",
      comment: "Two files that need each other are one file, or hide a third.",
      severity: "error",
      from: {},
      to: { circular: true },
    },
    {
      name: "routes-and-ui-without-database",
      comment:
        "Pages ask verbs and page reads; they never touch the database. Health asks the one file that answers for it.",
      severity: "error",
      from: { path: rooms(["routes", "ui"]), pathNot: IS_TEST },
      to: {
        path: "^app/database/|node_modules/(drizzle-orm|mysql2)/",
        pathNot: "^app/database/(enums|readiness\\.server)\\.ts$",
      },
    },
    {
      name: "ui-without-knowledge",
      comment: "The parts of the interface know no room.",
      severity: "error",
      from: { path: room("ui"), pathNot: IS_TEST },
      to: { path: rooms(SHELF) },
    },
    {
      name: "browser-without-server",
      comment: "What browsers load never reaches a .server file. A type alone is erased before it gets there.",
      severity: "error",
      from: { path: "^app/", pathNot: [IS_TEST, "\\.server\\.tsx?$", ROUTE_MODULES] },
      to: { path: "\\.server\\.tsx?$", dependencyTypesNot: ["type-only"] },
    },
    {
      name: "app-without-tests",
      comment: "What is shipped does not import tests, factories or the local stand-ins.",
      severity: "error",
      from: { path: "^app/", pathNot: IS_TEST },
      // The list of migrations is no code: with it a build knows which database it needs.
      to: { path: "^(tests|storage|drizzle)/|\\.test\\.tsx?$", pathNot: "^drizzle/migrations/meta/_journal\\.json$" },
    },
    {
      name: "nothing-unresolved",
      comment: "An import that leads nowhere.",
      severity: "error",
      from: { path: "^app/" },
      to: { couldNotResolve: true, pathNot: "^\\./\\+types/|\\+types/" },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    exclude: { path: "\\+types/" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    combinedDependencies: true,
    enhancedResolveOptions: {
      exportsFields: ["exports"],
      conditionNames: ["import", "types", "node", "default"],
      extensions: [".ts", ".tsx", ".mjs", ".js"],
    },
  },
};
