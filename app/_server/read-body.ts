import "server-only";
import type { z } from "zod";
import { type FieldError, no, ok, type Result } from "@/lib/result";

/** The largest body that an entrance takes (API.md: over 1 MB is 413). */
const BODY_MAX_BYTES = 1_000_000;

/** Reads a request's body as text, and stops reading once it is too large. */
async function readText(request: Request): Promise<Result<string>> {
  const tooLarge = no("tooLarge", "The body is over 1 MB. Send it in smaller parts.");
  if (Number(request.headers.get("content-length") ?? 0) > BODY_MAX_BYTES) return tooLarge;
  if (!request.body) return ok("");
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  // safe because a request's body is a web stream, which Node iterates
  for await (const chunk of request.body as unknown as AsyncIterable<Uint8Array>) {
    bytes += chunk.byteLength;
    if (bytes > BODY_MAX_BYTES) return tooLarge;
    chunks.push(chunk);
  }
  return ok(new TextDecoder().decode(Buffer.concat(chunks)));
}

/** Parses a JSON body with its schema; the errors name every path that cannot be taken. */
export async function readJson<T>(request: Request, schema: z.ZodType<T>): Promise<Result<T>> {
  const text = await readText(request);
  if (!text.ok) return text;
  let json: unknown;
  try {
    json = JSON.parse(text.value);
  } catch {
    return no("badJson", "The body is not valid JSON. Check commas, quotes and brackets.");
  }
  return check(json, schema);
}

/** Checks a value that came from outside; unknown fields are named one by one. */
export function check<T>(value: unknown, schema: z.ZodType<T>): Result<T> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return ok(parsed.data);
  const errors = fieldErrors(parsed.error);
  return no("invalid", `Check ${errors[0]?.path || "the body"}: ${errors[0]?.message}`, { errors });
}

/** Lists the fields of a Zod error as dotted paths, one entry per unknown field. */
function fieldErrors(error: z.ZodError): FieldError[] {
  return error.issues.flatMap((issue) => errorsOf(issue, []));
}

function errorsOf(issue: z.core.$ZodIssue, before: PropertyKey[]): FieldError[] {
  const path = [...before, ...issue.path];
  if (issue.code === "unrecognized_keys") {
    return issue.keys.map((key) => ({
      path: [...path, key].map(String).join("."),
      message: "This field is not known here.",
    }));
  }
  const meant = issue.code === "invalid_union" ? meantForm(issue.errors) : undefined;
  if (meant) return meant.flatMap((inner) => errorsOf(inner, path));
  return [{ path: path.map(String).join("."), message: issue.message }];
}

/** Of the forms that a value may have, the one that it has but for some of its fields. */
function meantForm(forms: z.core.$ZodIssue[][]): z.core.$ZodIssue[] | undefined {
  const isOther = ({ code, path }: z.core.$ZodIssue) =>
    path.length === 0 && (code === "invalid_type" || code === "invalid_value");
  return forms.find((issues) => issues.length > 0 && !issues.some(isOther));
}
