import { v7 as uuidv7 } from "uuid";
import type { Scope } from "@/db/client";
import { addPolicyVersion, choosePolicy, setRhythm } from "@/db/pay/commands";
import { assert } from "@/lib/assert";
import { policyOf } from "@/lib/pay/presets";
import { addDays } from "@/lib/time/site-day";
import { workweekStart } from "@/lib/time/workweek";

const CLERK = { by: "command:demo", name: "Winifred Ashgrove" };
const PERIOD_DAYS = 14;

/**
 * Writes how Larkmoor Stringworks pays: by the federal rules, a fortnight at a time. Two periods are
 * open: one that is over and waits to be closed, and the one that runs.
 *
 * @param today the site date on which the scenario is loaded
 */
export async function writePay(
  scope: Scope,
  { startsOn, today }: { startsOn: string; today: string },
): Promise<void> {
  const policy = policyOf("us-federal");
  const entered = { effectiveOn: startsOn, reason: "as it always was" };
  const version = { name: "us-federal", policy, after: 0, ...entered };
  const added = await addPolicyVersion(scope, version, CLERK);
  assert(added.ok, "writePay: an empty site takes a policy");
  const choice = { id: uuidv7(), worker: "", policy: "us-federal", ...entered };
  const chosen = await choosePolicy(scope, choice, CLERK);
  assert(chosen.ok, "writePay: the site takes the policy that it has");
  const running = addDays(workweekStart(today, policy.workweek.startsOn), -7);
  const first = addDays(running, -PERIOD_DAYS);
  const rhythm = { id: uuidv7(), startsOn: first, days: PERIOD_DAYS, reason: entered.reason };
  await setRhythm(scope, rhythm, { ...CLERK, today });
}
