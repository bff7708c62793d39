import type { Config } from "@react-router/dev/config";

export default {
  ssr: true,
  // Builds are kept by the hash of their sources, so that one being made never disturbs one being served.
  buildDirectory: process.env.COTTERPIN_BUILD || "build/by-hand",
  routeDiscovery: { mode: "initial" },
  future: {
    v8_middleware: true,
    v8_splitRouteModules: true,
    v8_viteEnvironmentApi: true,
    v8_passThroughRequests: true,
    v8_trailingSlashAwareDataRequests: true,
  },
} satisfies Config;
