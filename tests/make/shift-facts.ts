import type { ShiftFacts } from "@/lib/limits/shift-facts";
import { addDays } from "@/lib/time/site-day";
import { boundaryMs } from "@/lib/time/wall-time";

type Break = readonly [from: string, to: string, kind: "rest" | "meal" | "gap"];

/** A shift in local time, such as "2026-06-09", "22:00", "06:00"; unpaid breaks are not work. */
export function shiftOn(
  date: string,
  from: string,
  to: string,
  breaks: readonly Break[] = [],
  zone = "Europe/Madrid",
): ShiftFacts {
  const second = (time: string) => {
    const on = time >= from ? date : addDays(date, 1);
    return boundaryMs(`${on}T${time}`, zone) / 1000;
  };
  const timed = breaks.map(([start, end, kind]) => {
    return { kind, start: second(start), end: second(end) };
  });
  const unpaid = timed.filter(({ kind }) => kind !== "rest");
  const unpaidSeconds = unpaid.reduce((total, { start, end }) => total + end - start, 0);
  const [start, end] = [second(from), second(to)];
  return { start, end, date, workedSeconds: end - start - unpaidSeconds, breaks: timed };
}
