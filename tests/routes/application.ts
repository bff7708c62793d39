import path from "node:path";
import type { RouteConfigEntry } from "@react-router/dev/routes";
import {
  createRequestHandler,
  type ServerBuild,
  UNSAFE_withComponentProps,
  UNSAFE_withErrorBoundaryProps,
} from "react-router";
import routeConfig from "~/routes";

interface RouteFile {
  id: string;
  parentId?: string;
  path?: string;
  index?: boolean;
  // biome-ignore lint/suspicious/noExplicitAny: route modules have no common type.
  module: any;
}

const files = import.meta.glob("../../app/{root,routes/**/*}.{ts,tsx}");

async function load(file: string) {
  const found = files[path.posix.join("../../app", file)];
  if (!found) throw new Error(`The route ${file} has no file.`);
  return found();
}

/** Every route of the application with its module, by id; root first. */
export async function readRoutes(): Promise<Record<string, RouteFile>> {
  const routes: Record<string, RouteFile> = {
    root: { id: "root", path: "", module: await load("root.tsx") },
  };
  const add = async (entries: RouteConfigEntry[], parentId: string): Promise<void> => {
    for (const { file, path, index, children } of entries) {
      const id = file.replace(/\.tsx?$/, "");
      routes[id] = { id, parentId, path, index, module: await load(file) };
      await add(children ?? [], id);
    }
  };
  await add(await routeConfig, "root");
  return routes;
}

/** Hands components their props, as the compiler does. */
function compiled({ module, ...route }: RouteFile): RouteFile {
  const parts = { ...module };
  if (parts.default) parts.default = UNSAFE_withComponentProps(parts.default);
  if (parts.ErrorBoundary) parts.ErrorBoundary = UNSAFE_withErrorBoundaryProps(parts.ErrorBoundary);
  return { ...route, module: parts };
}

/** What the build makes of the routes, as far as answering requests needs it. */
export async function makeBuild(routes: Record<string, RouteFile>): Promise<ServerBuild> {
  const assets = Object.fromEntries(
    Object.values(routes).map(({ module: _module, ...route }) => [
      route.id,
      { ...route, module: `/${route.id}.js` },
    ]),
  );
  return {
    entry: { module: await import("~/entry.server") },
    routes: Object.fromEntries(Object.values(routes).map((route) => [route.id, compiled(route)])),
    assets: {
      entry: { module: "/entry.js", imports: [] },
      routes: assets,
      url: "/manifest.js",
      version: "1",
    },
    basename: "/",
    publicPath: "/",
    assetsBuildDirectory: "",
    future: {
      v8_middleware: true,
      v8_splitRouteModules: true,
      v8_viteEnvironmentApi: true,
      v8_passThroughRequests: true,
      v8_trailingSlashAwareDataRequests: true,
    },
    ssr: true,
    isSpaMode: false,
    prerender: [],
    routeDiscovery: { mode: "initial", manifestPath: "/__manifest" },
  } as unknown as ServerBuild;
}

/** Answers requests as the server does. */
export async function startApplication(
  build: ServerBuild,
): Promise<(path: string, init?: RequestInit) => Promise<Response>> {
  const answer = createRequestHandler(build, "production");
  return (path, init) => answer(new Request(`http://shop.example${path}`, { redirect: "manual", ...init }));
}

export const OURS = { Origin: "http://shop.example" };
