import { index, type RouteConfig, route } from "@react-router/dev/routes";

/** The map of addresses. A route says in its loader and action who may use it; one that does not is refused. */
export default [
  index("routes/auth/landing.ts"),
  route("sign-in", "routes/auth/sign-in.tsx"),
  route("sign-out", "routes/auth/sign-out.ts"),
  route("set-up", "routes/auth/set-up.tsx"),

  // check

  // pack

  // api
  route("api/health", "routes/api/health.ts"),

  route("*", "routes/not-found.tsx"),
] satisfies RouteConfig;
