import type { ReactNode } from "react";
import {
  isRouteErrorResponse,
  Links,
  Meta,
  Outlet,
  Scripts,
  ScrollRestoration,
  useMatches,
  useRouteLoaderData,
} from "react-router";
import type { Route } from "./+types/root";
import "./app.css";
import { Shell } from "~/components/layout/shell";
import { publicLoader } from "~/services/people/guard.server";
import { presentPerson } from "~/services/people/present-person";
import { rootMiddleware } from "~/services/people/root-middleware.server";
import { useNonce } from "~/utils/http-nonce";
import { readTheme } from "~/utils/read-theme";
import { ErrorPage } from "./routes/auth/error-page";

export const middleware = rootMiddleware;

/** When to come back, for pages that could not be shown. */
export const headers: Route.HeadersFunction = ({ errorHeaders }) => errorHeaders ?? new Headers();

export const loader = publicLoader(async ({ request }: Route.LoaderArgs, findPerson) => {
  const person = await findPerson();
  return { person: person && presentPerson(person), theme: readTheme(request.headers.get("Cookie")) };
});

export const meta: Route.MetaFunction = () => [
  { title: "Cotterpin" },
  { name: "description", content: "Which kits can ship, and what stops the rest." },
];

export function Layout({ children }: { children: ReactNode }) {
  const nonce = useNonce();
  const theme = useRouteLoaderData<typeof loader>("root")?.theme;
  return (
    <html lang="en-GB" data-theme={theme}>
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <link rel="icon" href="/favicon.svg" type="image/svg+xml" />
        <link rel="apple-touch-icon" href="/icons/icon-180.png" />
        <link rel="manifest" href="/manifest.webmanifest" />
        <Meta />
        <Links nonce={nonce} />
      </head>
      <body>
        {children}
        <ScrollRestoration nonce={nonce} />
        <Scripts nonce={nonce} />
      </body>
    </html>
  );
}

/** A page with `handle = { standsAlone: true }` has its own frame, also for people who have signed in. */
function standsAlone(handle: unknown): boolean {
  return (handle as { standsAlone?: boolean } | undefined)?.standsAlone === true;
}

export default function Root({ loaderData }: Route.ComponentProps) {
  const isAlone = useMatches().some(({ handle }) => standsAlone(handle));
  if (!loaderData.person || isAlone) return <Outlet />;
  return (
    <Shell person={loaderData.person}>
      <Outlet />
    </Shell>
  );
}

export function ErrorBoundary({ error }: Route.ErrorBoundaryProps) {
  const person = useRouteLoaderData<typeof loader>("root")?.person;
  const page = isRouteErrorResponse(error) ? (
    <ErrorPage status={error.status} problem={error.data} />
  ) : (
    <ErrorPage status={500} />
  );
  return person ? <Shell person={person}>{page}</Shell> : <main id="page">{page}</main>;
}
