import { reactRouter } from "@react-router/dev/vite";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig } from "vitest/config";

// Vitest reads this file too and must not see the framework's plugin.
const underTest = Boolean(process.env.VITEST);

const project = (name: string, include: string[], more: object = {}) => ({
  extends: true as const,
  test: { name, include, setupFiles: ["tests/setup/console.ts"], ...more },
});

export default defineConfig({
  plugins: underTest ? [] : [tailwindcss(), reactRouter()],
  cacheDir: process.env.ALIDADE_VITE_CACHE ?? "node_modules/.vite",
  resolve: { tsconfigPaths: true },
  ssr: { noExternal: ["@react-three/fiber"] },
  // Found only behind lazy imports otherwise, and a second pass would load React twice in the development server.
  optimizeDeps: {
    include: ["@dnd-kit/core", "@dnd-kit/sortable", "@dnd-kit/utilities", "@react-three/fiber", "three", "opentype.js"],
  },
  server: { host: "127.0.0.1" },
  test: {
    passWithNoTests: false,
    projects: [
      project("unit", ["app/**/*.test.{ts,tsx}", "!app/**/*.server.test.{ts,tsx}"]),
      project("server", ["app/**/*.server.test.{ts,tsx}", "storage/**/*.test.ts", "drizzle/**/*.test.ts"], {
        globalSetup: ["tests/setup/services.ts"],
        setupFiles: ["tests/setup/console.ts", "tests/setup/database.ts"],
        testTimeout: 20_000,
        hookTimeout: 60_000,
      }),
      project("reference", ["tests/reference/**/*.test.ts"], { testTimeout: 120_000 }),
      project("browser", ["tests/browser/**/*.test.ts"], {
        globalSetup: ["tests/setup/browser.ts"],
        testTimeout: 120_000,
        hookTimeout: 120_000,
        fileParallelism: false,
      }),
    ],
  },
});
