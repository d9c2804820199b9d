import type { z } from "zod";
import { policyOf } from "@/lib/pay/presets";
import { payPolicy } from "@/lib/pay/schema";
import type { PolicyBook, PolicyChoice, PolicyVersion } from "@/lib/policies/in-force";
import { boundaryMs } from "@/lib/time/wall-time";
import type { Span } from "@/lib/timesheet/shifts";

export const ZONE = "America/Chicago";

/** A version of a policy: a preset by its own name, or one's own. */
export function makeVersion(
  effectiveOn: string,
  other: Partial<Omit<PolicyVersion, "policy">> & { policy?: z.input<typeof payPolicy> } = {},
): PolicyVersion {
  const { name = "us-federal", version = 1, policy } = other;
  const whole = policy ? payPolicy.parse(policy) : policyOf("us-federal");
  return { name, version, effectiveOn, policy: whole };
}

/** A book in which the site has one policy from the start. */
export function makePolicyBook(
  versions: readonly PolicyVersion[] = [makeVersion("2026-01-01")],
  choices: readonly PolicyChoice[] = [],
): PolicyBook {
  const ofSite = { worker: null, policy: versions[0]!.name, effectiveOn: "2026-01-01" };
  return { versions, choices: [ofSite, ...choices] };
}

/** Spans in local time of `ZONE`: "2026-06-09T16:00", "2026-06-10T08:00", work unless it says else. */
export function localSpans(
  spans: readonly (readonly [start: string, end: string, kind?: Span["kind"]])[],
): Span[] {
  const second = (local: string) => Math.floor(boundaryMs(local, ZONE) / 1000);
  return spans.map(([start, end, kind = "work"]) => ({
    start: second(start),
    end: second(end),
    kind,
    rate: null,
  }));
}

/** So many hours from 08:00 on each of these days, none where it is 0. */
export function workedFrom(first: string, hours: readonly number[]): Span[] {
  const dayMs = 86_400_000;
  return localSpans(
    hours.flatMap((length, index) => {
      if (length === 0) return [];
      const date = new Date(Date.parse(`${first}T00:00:00Z`) + index * dayMs);
      const on = date.toISOString().slice(0, 10);
      const end = new Date(date.getTime() + (8 + length) * 3_600_000).toISOString().slice(0, 16);
      return [[`${on}T08:00`, end] as const];
    }),
  );
}
