import { type ActionFunctionArgs, data, type LoaderFunctionArgs, redirect } from "react-router";
import type { Act } from "~/schemas/people/act";
import { AppError } from "~/utils/errors";
import { describeError, log } from "~/utils/http-log.server";
import { isFault, problemResponse, toProblem } from "~/utils/problem";
import { type BodyType, FORM_TYPES, limitBody } from "~/utils/request-body";
import { requestFactsContext } from "~/utils/request-context";
import { assertMay } from "./assert-may.server";
import type { CurrentPerson } from "./current-person";
import { personContext } from "./person-context.server";

type Args = LoaderFunctionArgs | ActionFunctionArgs;
type Run<A, P, T> = (args: A, person: P) => T | Promise<T>;

/** A loader or action that says which act it is; root middleware refuses routes that do not say. */
type Guarded<A, T> = ((args: A) => Promise<T>) & { act: Act | "public" };

function declare<A, T>(act: Act | "public", run: (args: A) => Promise<T>): Guarded<A, T> {
  return Object.assign(run, { act });
}

async function personWhoMay(args: Args, act: Act): Promise<CurrentPerson> {
  const person = assertMay(await args.context.get(personContext)(), act);
  if (person.owesSecondFactor && act !== "own-account") throw owesSecondFactor();
  return person;
}

const SECOND_FACTOR = "A manager sets up a second factor at their account before anything else.";

function owesSecondFactor(): AppError {
  return new AppError("forbidden", SECOND_FACTOR);
}

/** The problem of an error; faults of ours go to the log under the request's id. */
function answerTo(error: unknown, args: Args) {
  const { id } = args.context.get(requestFactsContext);
  if (isFault(error))
    log.error({ requestId: id, pattern: args.pattern, error: describeError(error) }, "request failed");
  return toProblem(error, id);
}

/** Lets answers (redirects, thrown data) through and turns every other error into one that a page can show. */
function throwForPage(error: unknown, args: Args): never {
  if (error instanceof Response || isThrownData(error)) throw error;
  if (error instanceof AppError && error.code === "unauthenticated") {
    const { pathname, search } = args.url;
    throw redirect(pathname === "/" ? "/sign-in" : `/sign-in?to=${encodeURIComponent(pathname + search)}`);
  }
  if (error instanceof AppError && error.message === SECOND_FACTOR) throw redirect("/account");
  const problem = answerTo(error, args);
  const headers =
    problem.retryAfter === undefined ? undefined : { "Retry-After": String(problem.retryAfter) };
  throw data(problem, { status: problem.status, headers });
}

function isThrownData(error: unknown): boolean {
  return (
    typeof error === "object" &&
    error !== null &&
    (error as { type?: unknown }).type === "DataWithResponseInit"
  );
}

/**
 * Wraps a page's loader: only people who may do the act get in. Others are sent to sign in, or see a 403 page that
 * says who can. Errors of services become the page's error with their sentence.
 */
export function guardedLoader<A extends LoaderFunctionArgs, T>(
  act: Act,
  run: Run<A, CurrentPerson, T>,
): Guarded<A, T> {
  return declare(act, async (args) => {
    try {
      return await run(args, await personWhoMay(args, act));
    } catch (error) {
      throwForPage(error, args);
    }
  });
}

/** Wraps a page's action like `guardedLoader`; takes forms only, counted while they stream. */
export function guardedAction<A extends ActionFunctionArgs, T>(
  act: Act,
  run: Run<A, CurrentPerson, T>,
): Guarded<A, T> {
  return declare(act, async (args) => {
    try {
      const person = await personWhoMay(args, act);
      return await run({ ...args, request: limitBody(args.request, FORM_TYPES) }, person);
    } catch (error) {
      throwForPage(error, args);
    }
  });
}

/** Finds the person if a public page asks; null for those who have not signed in. */
type FindPerson = () => Promise<CurrentPerson | null>;

/** Wraps the loader of a page that is open to all. */
export function publicLoader<A extends LoaderFunctionArgs, T>(run: Run<A, FindPerson, T>): Guarded<A, T> {
  return declare("public", async (args) => {
    try {
      return await run(args, args.context.get(personContext));
    } catch (error) {
      throwForPage(error, args);
    }
  });
}

/** Wraps the action of a page that is open to all, such as signing in. */
export function publicAction<A extends ActionFunctionArgs, T>(run: Run<A, FindPerson, T>): Guarded<A, T> {
  return declare("public", async (args) => {
    try {
      return await run(
        { ...args, request: limitBody(args.request, FORM_TYPES) },
        args.context.get(personContext),
      );
    } catch (error) {
      throwForPage(error, args);
    }
  });
}

function asResponse(answer: unknown): Response {
  return answer instanceof Response ? answer : Response.json(answer);
}

/** Wraps a JSON route's loader: plain objects become JSON, errors become problems. */
export function apiLoader<A extends LoaderFunctionArgs>(
  act: Act,
  run: Run<A, CurrentPerson, unknown>,
): Guarded<A, Response> {
  return declare(act, async (args) => {
    try {
      return asResponse(await run(args, await personWhoMay(args, act)));
    } catch (error) {
      return error instanceof Response ? error : problemResponse(answerTo(error, args));
    }
  });
}

/** Wraps a JSON route's action; takes `application/json` up to 1 MB unless it names other types. */
export function apiAction<A extends ActionFunctionArgs>(
  act: Act,
  run: Run<A, CurrentPerson, unknown>,
  accepts: readonly BodyType[] = ["application/json"],
): Guarded<A, Response> {
  return declare(act, async (args) => {
    try {
      const person = await personWhoMay(args, act);
      return asResponse(await run({ ...args, request: limitBody(args.request, accepts) }, person));
    } catch (error) {
      return error instanceof Response ? error : problemResponse(answerTo(error, args));
    }
  });
}
