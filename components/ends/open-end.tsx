import Link from "next/link";
import { SettleForm } from "@/components/ends/settle-form";
import { DayStrip } from "@/components/seam/day-strip";
import type { FormAction } from "@/components/shell/use-answer";
import type { EndLine, EndOpen } from "@/lib/ends/view";
import { stripKinds } from "@/lib/hours/page";
import { stripSpan } from "@/lib/seam/day-strip";
import { clockText } from "@/lib/time/format";

/** What is known of the open loose end on the left, how it may be settled on the right. */
export function OpenEnd({
  line,
  open,
  formId,
  action,
  timeZone,
  nowSecond,
  looksAtHours,
}: {
  line: EndLine;
  open: EndOpen;
  formId: string;
  action: FormAction<void>;
  timeZone: string;
  nowSecond: number;
  looksAtHours: boolean;
}) {
  const { worker, name, code, subject } = line;
  return (
    <tr data-line="">
      <td data-book="" colSpan={4} className="ends-story">
        {open.story.map((sentence) => (
          <p key={sentence}>{sentence}</p>
        ))}
        {open.note && <p className="font-[650]">“{open.note}”</p>}
        {open.asksWorker && (
          <p className="text-ink-2">
            {name} is asked too, on the phone. An answer there settles it.
          </p>
        )}
        {worker && looksAtHours && (
          <p>
            <Link href={`/hours?${dayQuery(worker, open.day)}`}>Every record of that day</Link>
          </p>
        )}
      </td>
      <td data-day="" colSpan={3} className="ends-settle">
        <Strip open={open} timeZone={timeZone} nowSecond={nowSecond} />
        <SettleForm
          key={open.key}
          action={action}
          end={{ id: formId, code, subject }}
          ways={open.ways}
          proposed={open.proposed}
        />
      </td>
    </tr>
  );
}

function dayQuery(worker: string, day: string) {
  return new URLSearchParams({ worker, from: day, to: day, day });
}

function Strip({
  open: { stretches, planned },
  timeZone,
  nowSecond,
}: {
  open: EndOpen;
  timeZone: string;
  nowSecond: number;
}) {
  if (stretches.length === 0) return null;
  const drawn = stretches.map(({ start, end, activity }) => ({
    start,
    end: end ?? nowSecond,
    kind: stripKinds[activity],
  }));
  const plan = planned ? { from: planned.startMs / 1000, to: planned.endMs / 1000 } : undefined;
  const span = stripSpan(drawn, plan);
  const [from, to] = [clockText(span.from * 1000, timeZone), clockText(span.to * 1000, timeZone)];
  return (
    <div className="ends-strip">
      <DayStrip
        stretches={drawn}
        span={span}
        label={`The shift as it stands, ${from} to ${to}`}
        {...(plan ? { planned: plan } : {})}
      />
      <p className="flex justify-between text-ink-2">
        <span>{from}</span>
        <span>{to}</span>
      </p>
    </div>
  );
}
