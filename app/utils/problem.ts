import { AppError, type AppErrorCode, type FieldError } from "./errors";

/** The body of an error answer, as RFC 9457 describes it. */
export interface Problem {
  type: string;
  title: string;
  status: number;
  detail: string;
  errors?: FieldError[];
  /** Names the log entry when the fault is ours. */
  requestId?: string;
  retryAfter?: number;
}

const KINDS: Record<AppErrorCode, { status: number; title: string }> = {
  "bad-request": { status: 400, title: "The request could not be read" },
  unauthenticated: { status: 401, title: "Sign-in needed" },
  forbidden: { status: 403, title: "Not among your rights" },
  "not-found": { status: 404, title: "Not found" },
  conflict: { status: 409, title: "In conflict with what is there" },
  "too-large": { status: 413, title: "Too much at once" },
  "unsupported-type": { status: 415, title: "Not a type this address takes" },
  invalid: { status: 422, title: "The content is not valid" },
  "too-many": { status: 429, title: "Too many tries" },
  busy: { status: 503, title: "Busy just now" },
};

const DEFAULT_RETRY_SECONDS = 5;

/** Database faults that pass by themselves: the server is away, or every connection is in use. */
const PASSING_FAULTS = /^Sequelize(Connection|HostNotFound|HostNotReachable|AccessDenied|InvalidConnection)/;

function isPassingFault(error: unknown): boolean {
  return error instanceof Error && PASSING_FAULTS.test(error.name);
}

/** Whether the error is a fault of ours, to be logged, rather than an answer to the asker. */
export function isFault(error: unknown): boolean {
  return !(error instanceof AppError);
}

/**
 * Makes the problem of any error. Only the message of an `AppError` is shown; the rest gets a sentence
 * of ours, since database messages hold statements and values.
 */
export function toProblem(error: unknown, requestId?: string): Problem {
  if (error instanceof AppError) {
    const { status, title } = KINDS[error.code];
    const problem: Problem = {
      type: `urn:cotterpin:problem:${error.code}`,
      title,
      status,
      detail: error.message,
    };
    if (error.errors.length > 0) problem.errors = error.errors;
    if (status === 429 || status === 503) problem.retryAfter = error.retryAfter ?? DEFAULT_RETRY_SECONDS;
    return problem;
  }
  if (isPassingFault(error)) {
    return {
      ...toProblem(
        new AppError("busy", "The database does not answer just now. Try again in a few seconds."),
      ),
      requestId,
    };
  }
  return {
    type: "urn:cotterpin:problem:fault",
    title: "Something went wrong here",
    status: 500,
    detail:
      "This is a fault in the program, not in what you sent. Nothing was changed; try again, and if it stays, tell whoever looks after Cotterpin the request number.",
    requestId,
  };
}

/** The HTTP answer for a problem: `application/problem+json`, with `Retry-After` where it helps. */
export function problemResponse(problem: Problem): Response {
  const { retryAfter, ...body } = problem;
  const headers = new Headers({
    "Content-Type": "application/problem+json; charset=utf-8",
    "Cache-Control": "no-store",
  });
  if (retryAfter !== undefined) headers.set("Retry-After", String(retryAfter));
  return new Response(JSON.stringify(body), { status: problem.status, headers });
}
