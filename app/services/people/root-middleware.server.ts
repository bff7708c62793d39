import { randomBytes, randomUUID } from "node:crypto";
import type { MiddlewareFunction } from "react-router";
import { readEnv } from "~/utils/env";
import { AppError } from "~/utils/errors";
import { setSecurityHeaders } from "~/utils/http-headers";
import { type Problem, problemResponse, toProblem } from "~/utils/problem";
import { requestFactsContext } from "~/utils/request-context";
import { isFromOurPages } from "~/utils/request-origin";
import { findAsker } from "./find-asker.server";
import { findUndeclared } from "./find-undeclared.server";
import { personContext } from "./person-context.server";

type Middleware = MiddlewareFunction<Response>;
type Args = Parameters<Middleware>[0];

const { publicUrl } = readEnv();

function isApi({ url }: Args): boolean {
  return url.pathname.startsWith("/api/");
}

/** A refusal before any route runs: JSON for programs, a plain sentence for people. */
function refuse(problem: Problem, args: Args): Response {
  if (isApi(args)) return problemResponse(problem);
  return new Response(`${problem.detail}\n`, {
    status: problem.status,
    headers: { "Content-Type": "text/plain; charset=utf-8" },
  });
}

/** Names the request, and sets on every answer the headers that keep it safe. */
const nameAndSecure: Middleware = async ({ context, url }, next) => {
  const facts = { id: randomUUID(), nonce: randomBytes(16).toString("base64") };
  context.set(requestFactsContext, facts);
  const response = await next();
  setSecurityHeaders(response.headers, {
    nonce: facts.nonce,
    requestId: facts.id,
    secure: url.protocol === "https:" || publicUrl?.startsWith("https:") === true,
    development: import.meta.env.DEV,
  });
  return response;
};

/** Refuses changes that do not come from our own pages; a program shows itself by its token instead. */
const checkOrigin: Middleware = async (args, next) => {
  const { request, url } = args;
  if (request.method === "GET" || request.method === "HEAD") return next();
  const byToken = isApi(args) && /^Bearer /i.test(request.headers.get("Authorization") ?? "");
  if (byToken || isFromOurPages(request.headers, url, publicUrl)) return next();
  const detail =
    "This request did not come from a page of this address, so nothing was changed. Open Cotterpin at its own address and try again; behind a proxy, PUBLIC_URL has to name that address.";
  return refuse(toProblem(new AppError("forbidden", detail)), args);
};

/** Refuses routes that do not declare who may use them, and answers programs in JSON where no route is. */
const denyUndeclared: Middleware = async (args, next) => {
  const undeclared = await findUndeclared();
  if (undeclared.has(args.pattern)) {
    return refuse(
      toProblem(new AppError("forbidden", "Nobody has said yet who may use this address.")),
      args,
    );
  }
  if (isApi(args) && args.pattern === "*") {
    return refuse(toProblem(new AppError("not-found", "There is nothing at this address.")), args);
  }
  return next();
};

const findOutWho: Middleware = async (args, next) => {
  let asker: ReturnType<typeof findAsker> | undefined;
  args.context.set(personContext, () => {
    asker ??= findAsker(args.request.headers, { tokens: isApi(args) });
    return asker;
  });
  return next();
};

/** What the framework itself answers under /api becomes a problem as well: above all a method that is not there. */
const answerInJson: Middleware = async (args, next) => {
  const response = await next();
  // Answers of our routes are JSON and leave the status's words to the server.
  const isOurs = response.headers.get("Content-Type")?.includes("json") && response.statusText === "";
  if (!isApi(args) || response.status < 400 || isOurs) return response;
  if (response.status >= 500)
    return problemResponse(toProblem(null, args.context.get(requestFactsContext).id));
  return problemResponse({
    type: "urn:cotterpin:problem:method",
    title: "Not a method this address takes",
    status: 405,
    detail: `${args.request.method} is not possible at this address.`,
  });
};

/** What runs around every request, outermost first. */
export const rootMiddleware: Middleware[] = [
  nameAndSecure,
  checkOrigin,
  answerInJson,
  denyUndeclared,
  findOutWho,
];
