import "server-only";
import pino from "pino";
import { env } from "@/app/_server/env";

let logger: pino.Logger | undefined;

/** The server's log: JSON lines on standard output, without names, PINs or tokens. */
export function log(): pino.Logger {
  logger ??= pino({ level: env().LOG_LEVEL, base: null });
  return logger;
}
