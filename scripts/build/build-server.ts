import { build } from "vite";

/** Compiles scripts/serve.ts into a build that `react-router build` has made: node_modules stay outside. */
await build({
  configFile: false,
  logLevel: "warn",
  publicDir: false,
  resolve: { tsconfigPaths: true },
  build: {
    ssr: "scripts/serve.ts",
    outDir: process.argv[2],
    emptyOutDir: false,
    target: "node20",
    rollupOptions: { output: { entryFileNames: "serve.js" } },
  },
});
