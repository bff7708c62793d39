import { index, type RouteConfig, route } from "@react-router/dev/routes";

/** The map of addresses. A route says in its loader and action who may use it; one that does not is refused. */
export default [
  index("routes/auth/landing.ts"),
  route("sign-in", "routes/auth/sign-in.tsx"),
  route("sign-in/code", "routes/auth/sign-in-code.tsx"),
  route("sign-out", "routes/auth/sign-out.ts"),
  route("set-up", "routes/auth/set-up.tsx"),
  route("welcome/:token", "routes/auth/welcome.tsx"),
  route("forgotten", "routes/auth/forgotten.tsx"),
  route("new-password/:token", "routes/auth/new-password.tsx"),

  // account
  route("account", "routes/auth/account.tsx"),

  // admin
  route("admin/people", "routes/admin/people.tsx"),
  route("admin/people/:id", "routes/admin/person.tsx"),
  route("admin/mail", "routes/admin/mail.tsx"),
  route("admin/mail/:id", "routes/admin/mail-text.tsx"),
  route("admin/audit", "routes/admin/audit.tsx"),
  route("admin/audit.csv", "routes/admin/audit-file.ts"),

  // check
  route("check", "routes/check/check.tsx", [route("why", "routes/check/why.tsx")]),

  // pack
  route("pack", "routes/pack/pack.ts"),
  route("pack/kit-orders", "routes/pack/kit-orders.tsx"),
  route("pack/kit-orders/new", "routes/pack/new-kit-order.tsx"),
  route("pack/kit-orders/:number", "routes/pack/edit-kit-order.tsx"),
  route("pack/kit-orders/:number/cancel", "routes/pack/cancel-kit-order.tsx"),

  // find
  route("find", "routes/find/search.tsx"),
  route("find/parts/:partNumber", "routes/find/part.tsx"),
  route("find/bins/:bin", "routes/find/bin.tsx"),
  route("find/suppliers/:supplier", "routes/find/supplier.tsx"),
  route("find/purchase-orders/:number", "routes/find/purchase-order.tsx"),
  route("find/shop-orders/:number", "routes/find/shop-order.tsx"),
  route("find/kit-orders/:number", "routes/find/kit-order.tsx"),
  route("find/parts/:partNumber/structure", "routes/find/structure.tsx"),
  route("find/files", "routes/find/files.tsx"),

  // api
  route("api/ship-check", "routes/api/ship-check.ts"),
  route("api/ship-line", "routes/api/ship-line.ts"),
  route("api/effects", "routes/api/effects.ts"),
  route("api/check-answer", "routes/api/check-answer.ts"),
  route("api/check-csv", "routes/api/check-csv.ts"),
  route("api/why", "routes/api/why.ts"),
  route("api/find", "routes/api/find.ts"),
  route("api/parts", "routes/api/parts.ts"),
  route("api/parts/:partNumber", "routes/api/part.ts"),
  route("api/structure/:partNumber", "routes/api/structure.ts"),
  route("api/where-used/:partNumber", "routes/api/where-used.ts"),
  route("api/stock", "routes/api/stock.ts"),
  route("api/movements", "routes/api/movements.ts"),
  route("api/movements/:id/reverse", "routes/api/reverse-movement.ts"),
  route("api/imports/:kind", "routes/api/imports.ts"),
  route("api/exports/book", "routes/api/export-book.ts"),
  route("api/exports/:kind", "routes/api/exports.ts"),
  route("api/openapi.json", "routes/api/openapi.ts"),
  route("api/health", "routes/api/health.ts"),

  route("*", "routes/not-found.tsx"),
] satisfies RouteConfig;
