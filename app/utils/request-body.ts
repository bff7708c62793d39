import type { z } from "zod";
import { AppError } from "./errors";

export type BodyType =
  | "application/json"
  | "text/csv"
  | "application/x-www-form-urlencoded"
  | "multipart/form-data";

export const FORM_TYPES: readonly BodyType[] = ["application/x-www-form-urlencoded", "multipart/form-data"];

const MEGABYTE = 1024 * 1024;

const LIMITS: Record<BodyType, number> = {
  "application/json": MEGABYTE,
  "application/x-www-form-urlencoded": MEGABYTE,
  "text/csv": 20 * MEGABYTE,
  "multipart/form-data": 20 * MEGABYTE,
};

/**
 * The same request with a body that is counted while it streams, so that nobody fills the memory.
 * @throws AppError `unsupported-type` for another content type; reading past the limit fails with `too-large`
 */
export function limitBody(request: Request, accepts: readonly BodyType[]): Request {
  const sent = (request.headers.get("Content-Type") ?? "").split(";")[0].trim().toLowerCase();
  const type = accepts.find((accepted) => accepted === sent);
  if (!type) {
    throw new AppError("unsupported-type", `Send the content as ${accepts.join(" or ")}.`);
  }
  const limit = LIMITS[type];
  if (Number(request.headers.get("Content-Length") ?? 0) > limit) throw tooLarge(limit);
  if (!request.body) return request;
  const limited = new Request(request.url, {
    method: request.method,
    headers: request.headers,
    signal: request.signal,
    body: request.body.pipeThrough(countBytes(limit)),
    duplex: "half",
  } as RequestInit);
  const readForm = limited.formData.bind(limited);
  limited.formData = () => readForm().catch(refuseBrokenForm);
  return limited;
}

/** For what reading a form throws: a body that is no form is the sender's fault, not ours. */
export function refuseBrokenForm(error: unknown): never {
  if (error instanceof TypeError)
    throw new AppError("bad-request", "The form could not be read. Load the page again.");
  throw error;
}

function countBytes(limit: number): TransformStream<Uint8Array, Uint8Array> {
  let seen = 0;
  return new TransformStream({
    transform(chunk, controller) {
      seen += chunk.byteLength;
      if (seen > limit) controller.error(tooLarge(limit));
      else controller.enqueue(chunk);
    },
  });
}

function tooLarge(limit: number): AppError {
  return new AppError("too-large", `This is more than ${limit / MEGABYTE} MB. Send it in smaller pieces.`);
}

/**
 * The JSON body of a request, checked by its schema.
 * @throws AppError `bad-request` for what is no JSON, `invalid` with one error a field for the rest
 */
export async function readJson<S extends z.ZodType>(request: Request, schema: S): Promise<z.output<S>> {
  const text = await request.text();
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new AppError("bad-request", "The body is not valid JSON.");
  }
  return parseInput(schema, value);
}

/**
 * Checks input by its schema.
 * @throws AppError `invalid` with one error a field
 */
export function parseInput<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const errors = parsed.error.issues.map(({ path, message }) => ({ field: path.join("."), message }));
  throw new AppError("invalid", errors.length === 1 ? errors[0].message : "Some fields need another look.", {
    errors,
  });
}
