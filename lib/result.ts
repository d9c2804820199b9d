/** Every way in which a request can be answered no; `app/_server/problem.ts` gives each a status. */
export type ProblemCode =
  | "badJson"
  | "invalid"
  | "unauthenticated"
  | "forbidden"
  | "notFound"
  | "conflict"
  | "gone"
  | "tooLarge"
  | "throttled"
  | "unavailable";

/** One field that cannot be taken, named by its path (`events.0.at`), with what to do about it. */
export interface FieldError {
  path: string;
  message: string;
}

/** A closed door or a person's mistake: `detail` is a plain sentence that says what to do. */
export interface Problem {
  code: ProblemCode;
  detail: string;
  errors?: FieldError[];
  retryAfterSeconds?: number;
}

export type Result<T> = { ok: true; value: T } | { ok: false; problem: Problem };

/** A yes with its value. */
export function ok<T>(value: T): Result<T> {
  return { ok: true, value };
}

/** A no with its reason; `more` carries field errors or a waiting time. */
export function no(
  code: ProblemCode,
  detail: string,
  more: Pick<Problem, "errors" | "retryAfterSeconds"> = {},
): { ok: false; problem: Problem } {
  return { ok: false, problem: { code, detail, ...more } };
}

/** A no that hangs on one field of a form: something else has its value, or it is gone. */
export function noField(path: string, message: string): { ok: false; problem: Problem } {
  return no("conflict", message, { errors: [{ path, message }] });
}
