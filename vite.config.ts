import { reactRouter } from "@react-router/dev/vite";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig } from "vite";

export default defineConfig({
  plugins: [tailwindcss(), reactRouter()],
  resolve: { tsconfigPaths: true },
  server: { watch: { ignored: ["**/.local/**", "**/build/**", "**/test-results/**"] } },
  optimizeDeps: {
    include: ["@tanstack/react-query", "zod"],
    exclude: ["sequelize", "mariadb", "bcryptjs", "remix-auth", "remix-auth-form"],
  },
});
