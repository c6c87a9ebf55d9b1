import { existsSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

// Imported first: what .env says must be known before any other module reads the environment.
// A variable that is already set wins over the file.
const file = join(dirname(dirname(fileURLToPath(import.meta.url))), ".env");
if (existsSync(file) && typeof process.loadEnvFile === "function") process.loadEnvFile(file);
