import type { Config } from "@react-router/dev/config";

export default {
  ssr: true,
  // The framework compares Origin with the address that it sees itself: behind a proxy that ends TLS no form would pass.
  // Our own check (refuseForeignOrigins) stands before every route, compares with PUBLIC_URL, and wants an Origin.
  allowedActionOrigins: ["**"],
  future: {
    v8_middleware: true,
    v8_splitRouteModules: true,
    v8_viteEnvironmentApi: true,
    v8_passThroughRequests: true,
    v8_trailingSlashAwareDataRequests: true,
  },
} satisfies Config;
