import { parseEnvironment } from "#app/env.server.ts";

// A wrong variable stops the start with its name, before anything is built or served.
try {
  parseEnvironment(process.env);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
}
