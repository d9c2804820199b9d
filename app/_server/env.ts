import "server-only";
import { z } from "zod";

/** The environment, parsed once; nothing else reads `process.env`. */
const environment = z.object({
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  /** Seals the office's session cookie; at least 32 characters. */
  SESSION_SECRET: z.string().min(32),
  BOOKMATCH_DEMO: z.enum(["0", "1"]).default("1"),
  LOG_LEVEL: z.enum(["debug", "info", "warn", "error", "silent"]).default("info"),
});

export type Env = z.infer<typeof environment>;

let parsed: Env | undefined;

/**
 * Reads the environment at the first use, not at import: the build has none.
 *
 * @throws Error that names every variable that is missing or wrong
 */
export function env(): Env {
  if (parsed) return parsed;
  const result = environment.safeParse(process.env);
  if (!result.success) {
    throw new Error(`Environment: ${z.prettifyError(result.error)}`);
  }
  parsed = result.data;
  return parsed;
}
