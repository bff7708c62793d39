/** What went wrong, in the terms of HTTP; `~/utils/problem` gives each code its status. */
export type AppErrorCode =
  | "bad-request"
  | "unauthenticated"
  | "forbidden"
  | "not-found"
  | "conflict"
  | "too-large"
  | "unsupported-type"
  | "invalid"
  | "too-many"
  | "busy";

/** One thing wrong with the input: a form field, or a line and column of a file. */
export interface FieldError {
  field?: string;
  line?: number;
  column?: string;
  value?: string;
  /** The value is a header that the kind of file does not have. */
  unknownHeader?: true;
  message: string;
}

interface AppErrorExtras {
  errors?: FieldError[];
  /** Seconds after which another try makes sense (429 and 503). */
  retryAfter?: number;
}

/** An expected failure: its message is a sentence for the person that says what to do. */
export class AppError extends Error {
  readonly code: AppErrorCode;
  readonly errors: FieldError[];
  readonly retryAfter: number | undefined;

  constructor(code: AppErrorCode, message: string, extras: AppErrorExtras = {}) {
    super(message);
    this.name = "AppError";
    this.code = code;
    this.errors = extras.errors ?? [];
    this.retryAfter = extras.retryAfter;
  }
}
