import type { z } from "zod";
import type { PayAnswer } from "@/lib/pay/answer";
import { payRequest } from "@/lib/pay/request";
import { payStatement } from "@/lib/pay/statement";
import { boundaryMs } from "@/lib/time/wall-time";
import checks from "@/tests/checks/overtime.json";

type Asked = z.input<typeof payRequest>;

/** A span in local time: "2026-06-09T16:00", "2026-06-10T08:00", work unless it says else. */
export type LocalSpan = readonly [
  start: string,
  end: string,
  kind?: "work" | "rest" | "meal",
  rate?: string,
];

interface Case {
  spans: readonly LocalSpan[];
  zone?: string;
  policy?: Asked["policy"];
  from?: string;
  to?: string;
  extras?: NonNullable<Asked["extras"]>;
}

/** A request for spans in local time; the range is June 2026, where 7 June is a Sunday. */
export function askedFor(asked: Case): Asked {
  const { zone = "America/Los_Angeles", policy = "us-california" } = asked;
  const { from = "2026-06-01", to = "2026-07-01", extras } = asked;
  const instant = (local: string) => new Date(boundaryMs(local, zone)).toISOString();
  const spans = asked.spans.map(([start, end, kind = "work", rate]) => ({
    start: instant(start),
    end: instant(end),
    kind,
    ...(rate === undefined ? {} : { rate }),
  }));
  return { timeZone: zone, from, to, policy, spans, ...(extras ? { extras } : {}) };
}

/** The statement of spans in local time. */
export function stated(asked: Case): PayAnswer {
  return payStatement(payRequest.parse(askedFor(asked)));
}

/** One span of so many hours from 08:00 on each day from `first` on; none where it is 0. */
export function daily(first: string, hours: readonly number[], rate?: string): LocalSpan[] {
  return hours.flatMap((length, index): LocalSpan[] => {
    if (length === 0) return [];
    const day = new Date(Date.parse(`${first}T00:00:00Z`) + index * 86_400_000);
    const end = new Date(day.getTime() + (8 + length) * 3_600_000).toISOString().slice(0, 19);
    const start = `${day.toISOString().slice(0, 10)}T08:00:00`;
    return [rate === undefined ? [start, end] : [start, end, "work", rate]];
  });
}

/** A check of tests/checks/overtime.json; its source stands beside its values there. */
export function payCheck<G, E>(id: string): { source: string; given: G; expect: E } {
  const found = checks.find((check) => check.id === id);
  if (!found) throw new Error(`no check ${id} in overtime.json`);
  // safe because each test reads the fields that its own check has
  return found as unknown as { source: string; given: G; expect: E };
}

export const HOUR = 3600;
