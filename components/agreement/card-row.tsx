import Link from "next/link";
import { useState } from "react";
import { plannedWords } from "@/components/me/planned-words";
import { SeamGauge } from "@/components/seam/gauge";
import { Icon } from "@/components/ui/icon";
import { NumberCell } from "@/components/ui/table";
import type { CardLine } from "@/lib/agreement/page";
import { dayText, decimalHour } from "@/lib/time/format";
import { addDays } from "@/lib/time/site-day";

/** One card: planned and present, what to look at, and who has agreed. */
export function CardRow({
  line,
  range,
  scaleSeconds,
}: {
  line: CardLine;
  range: { from: string; to: string };
  scaleSeconds: number;
}) {
  const { number, name, cell, plannedSeconds, presentSeconds, toAgree } = line;
  const [isTicked, setTicked] = useState(toAgree.length > 0 && line.openEnds === 0);
  const days = new URLSearchParams({
    worker: number,
    from: range.from,
    to: addDays(range.to, -1),
  });
  return (
    <tr>
      <td data-book="">
        {toAgree.length > 0 && (
          <input
            type="checkbox"
            className="size-6 accent-ink"
            aria-label={`Agree to the card of ${name}`}
            checked={isTicked}
            onChange={(event) => setTicked(event.target.checked)}
          />
        )}
        {isTicked &&
          toAgree.map((day) => <input key={day} type="hidden" name="days[]" value={day} />)}
      </td>
      <td data-book="" className="code text-ink-2">
        {number}
      </td>
      <td data-book="" className="desk-cut font-[650]">
        <Link href={`/hours?${days}`}>{name}</Link>
      </td>
      <td data-book="" className="desk-cut text-ink-2">
        {cell}
      </td>
      <NumberCell data-book="" data-standard="" data-label="planned">
        {plannedSeconds === null ? "none" : decimalHour(plannedSeconds)}
      </NumberCell>
      <td data-gauge="">
        <SeamGauge
          standardSeconds={plannedSeconds}
          actualSeconds={presentSeconds}
          flush
          size="cell"
          state={line.runningDays > 0 ? "live" : "finished"}
          scaleSeconds={scaleSeconds}
          words={plannedWords}
          name={`${name}, planned and present`}
        />
      </td>
      <NumberCell data-day="" data-actual="" data-label="present">
        {decimalHour(presentSeconds)}
      </NumberCell>
      <td data-day="" className="desk-cut">
        <ToLookAt line={line} />
      </td>
      <td data-day="">
        <Signed isSigned={line.isSignedByWorker} who="the worker" />
      </td>
      <td data-day="">
        <Signed isSigned={line.isSignedByLead} who="the lead" />
      </td>
    </tr>
  );
}

function ToLookAt({ line: { openEnds, lapsed, runningDays } }: { line: CardLine }) {
  if (openEnds > 0) {
    return (
      <Link href="/ends" className="tag text-danger">
        <Icon name="loose" />
        {openEnds} to settle
      </Link>
    );
  }
  if (lapsed.length > 0)
    return <>changed since: {lapsed.map((date) => dayText(date, "en-GB")).join(", ")}</>;
  return runningDays > 0 ? <span className="text-ink-2">a day still runs</span> : null;
}

function Signed({ isSigned, who }: { isSigned: boolean; who: string }) {
  return isSigned ? (
    <span role="img" aria-label={`${who} agreed`}>
      <Icon name="good" />
    </span>
  ) : (
    <span role="img" aria-label={`not agreed by ${who}`} className="agreement-open" />
  );
}
