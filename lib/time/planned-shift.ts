import { addDays, type Stretch } from "@/lib/time/site-day";
import { boundaryMs } from "@/lib/time/wall-time";

/**
 * The bounds of a shift that is planned in local time. An end at or before the start is on the next
 * day; the length is physical, so 22:00 to 06:00 is 7 or 9 hours when clocks change.
 *
 * @param plan `on` is the date of the start, `from` and `to` are "HH:MM"
 */
export function plannedShift(
  plan: { on: string; from: string; to: string },
  zone: string,
): Stretch {
  const endsOn = plan.to > plan.from ? plan.on : addDays(plan.on, 1);
  return {
    start: Math.floor(boundaryMs(`${plan.on}T${plan.from}`, zone) / 1000),
    end: Math.floor(boundaryMs(`${endsOn}T${plan.to}`, zone) / 1000),
  };
}
