import { reactRouter } from "@react-router/dev/vite";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig } from "vite";

export default defineConfig({
  plugins: [tailwindcss(), reactRouter()],
  resolve: { tsconfigPaths: true },
  server: { watch: { ignored: ["**/.local/**", "**/build/**", "**/test-results/**"] } },
  environments: {
    client: {
      build: {
        rolldownOptions: {
          output: {
            // What every page loads comes in few files: small ones cost more in headers than they hold.
            codeSplitting: {
              groups: [
                {
                  name: "base",
                  test: /node_modules[\\/](react|react-dom|react-router|scheduler|turbo-stream|cookie|@tanstack[\\/](react-query|query-core))[\\/]/,
                },
                {
                  name: "shell",
                  test: /app[\\/](utils[\\/]format|components[\\/]layout|hooks[\\/]use-close)/,
                },
              ],
            },
          },
        },
      },
    },
  },
  optimizeDeps: {
    include: ["@tanstack/react-query", "zod"],
    exclude: ["sequelize", "mariadb", "bcryptjs", "remix-auth", "remix-auth-form"],
  },
});
