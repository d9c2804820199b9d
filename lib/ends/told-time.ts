import { no, ok, type Result } from "@/lib/result";
import { wallInstants } from "@/lib/time/wall-time";

/**
 * The instant of a local time that somebody told, epoch milliseconds; null where none was. A time
 * that the clocks skip, and one that they show twice, are asked for again rather than guessed.
 *
 * @param local date and time without offset, "2026-05-06T14:30", or empty
 */
export function toldTime(local: string, zone: string): Result<number | null> {
  if (!local) return ok(null);
  const { times, earlierMs } = wallInstants(local, zone);
  if (times === 1) return ok(earlierMs);
  const message =
    times === 0
      ? "The clocks were put forward past that time. Give another."
      : "The clocks showed that time twice that night. Give one before or after that hour.";
  return no("invalid", message, { errors: [{ path: "time", message }] });
}
