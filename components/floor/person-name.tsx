import { Correction } from "@/components/records/correction";
import type { FormAction } from "@/components/shell/use-answer";
import { clockText } from "@/lib/time/format";
import { localDate } from "@/lib/time/site-day";

/** For whom a forgotten start or end may be entered, and the action that does it. */
export interface Forgotten {
  action: FormAction<void>;
  /** Numbers of the workers; null for everybody. */
  workers: readonly string[] | null;
}

/** Somebody's name; for who may, it opens the question when the shift began or ended. */
export function PersonName({
  person: { worker, name },
  deed,
  proposedSecond,
  timeZone,
  forgotten,
}: {
  person: { worker: string; name: string };
  deed: "shift-start" | "shift-end";
  proposedSecond: number;
  timeZone: string;
  forgotten: Forgotten | null;
}) {
  if (!forgotten || forgotten.workers?.includes(worker) === false) return <bdi>{name}</bdi>;
  const isEnd = deed === "shift-end";
  const day = localDate(proposedSecond * 1000, timeZone);
  const hours = new URLSearchParams({ worker, from: day, to: day, day });
  return (
    <Correction
      action={forgotten.action}
      label={`${name}: ${isEnd ? "end" : "start"} the shift`}
      title={isEnd ? `${name} left` : `${name} came in`}
      fields={{ worker }}
      timeLabel={isEnd ? "The shift ended at" : "The shift started at"}
      proposed={`${day}T${clockText(proposedSecond * 1000, timeZone)}`}
      deeds={[{ deed, label: isEnd ? "End the shift" : "Start the shift" }]}
      more={{ href: `/hours?${hours}`, label: "Every record of that day" }}
    >
      <bdi>{name}</bdi>
    </Correction>
  );
}
