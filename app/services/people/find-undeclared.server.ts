interface RouteModule {
  loader?: unknown;
  action?: unknown;
  default?: unknown;
}

interface BuiltRoute {
  id: string;
  parentId?: string;
  path?: string;
  module: RouteModule;
}

let known: { routes: unknown; patterns: Set<string> } | undefined;

/** Whether each loader and action says its act, and each page has a loader so that the guard runs for it. */
export function isDeclared(module: RouteModule, isRoot: boolean): boolean {
  const parts = [module.loader, module.action].filter((part) => part !== undefined);
  const saysAct = parts.every((part) => typeof part === "function" && "act" in part);
  const hasGuard =
    module.loader !== undefined || (module.default === undefined && module.action !== undefined);
  return saysAct && (hasGuard || isRoot);
}

/** The patterns of all routes that do not declare who may use them: the first middleware refuses them. */
export async function findUndeclared(): Promise<Set<string>> {
  const { routes } = (await import("virtual:react-router/server-build")) as unknown as {
    routes: Record<string, BuiltRoute>;
  };
  if (known?.routes !== routes) known = { routes, patterns: undeclaredPatterns(routes) };
  return known.patterns;
}

function undeclaredPatterns(routes: Record<string, BuiltRoute>): Set<string> {
  const faulty = Object.values(routes).filter(
    (route) => route && !isDeclared(route.module, route.id === "root"),
  );
  return new Set(faulty.map((route) => patternOf(route, routes)));
}

function patternOf(route: BuiltRoute, routes: Record<string, BuiltRoute>): string {
  const parts: string[] = [];
  for (let at: BuiltRoute | undefined = route; at; at = at.parentId ? routes[at.parentId] : undefined) {
    if (at.path) parts.unshift(at.path);
  }
  return parts.join("/").replace(/\/{2,}/g, "/") || "/";
}
