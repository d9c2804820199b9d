import { Empty } from "@/components/ui/empty";
import type { FloorView } from "@/lib/floor/schema";
import { clockText, dayText } from "@/lib/time/format";
import { localDate } from "@/lib/time/site-day";

/** A floor that nobody is on, and when the hall opens, if a shift is planned. */
export function NobodyIn({ floor, nowMs }: { floor: FloorView; nowMs: number }) {
  const { opensAt, timeZone } = floor;
  if (opensAt === null) return <Empty>No one is in, and no shift is planned.</Empty>;
  const day = localDate(opensAt * 1000, timeZone);
  const when = day === localDate(nowMs, timeZone) ? "" : ` on ${dayText(day, "en-GB")}`;
  return (
    <Empty>
      No one is in. The hall opens{when} at {clockText(opensAt * 1000, timeZone)}.
    </Empty>
  );
}
