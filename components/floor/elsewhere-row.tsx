import { type Forgotten, PersonName } from "@/components/floor/person-name";
import { SeamGauge } from "@/components/seam/gauge";
import type { PresentElsewhere } from "@/lib/floor/schema";
import { otherWorkWords } from "@/lib/ledger/other-work-words";
import { actualMinutes } from "@/lib/seam/verdict";
import { clockText } from "@/lib/time/format";

/** Someone who is in and on no ticket: other work, a break, or nothing yet. */
export function ElsewhereRow({
  person,
  now,
  scaleSeconds,
  timeZone,
  forgotten,
}: {
  person: PresentElsewhere;
  now: number;
  scaleSeconds: number;
  timeZone: string;
  forgotten: Forgotten | null;
}) {
  const { doing, code, since } = person;
  const seconds = Math.max(0, now - since);
  return (
    <tr className="text-ink-2">
      <td data-book="" colSpan={3}>
        {words(doing, code)}
      </td>
      <td data-gauge="">
        {doing === "indirect" && (
          <SeamGauge
            standardSeconds={null}
            actualSeconds={seconds}
            scaleSeconds={scaleSeconds}
            state="other-work"
            flush
            name={otherWorkWords(code)}
          />
        )}
      </td>
      <td data-day="">{actualMinutes(seconds)} min</td>
      <td data-day="">
        <span className="text-ink">
          <PersonName
            person={person}
            deed="shift-end"
            proposedSecond={now}
            timeZone={timeZone}
            forgotten={forgotten}
          />
        </span>
        , since {clockText(since * 1000, timeZone)}
      </td>
    </tr>
  );
}

function words(doing: PresentElsewhere["doing"], code: string | null): string {
  if (doing === "indirect") return `Other work: ${otherWorkWords(code)}`;
  if (doing === "unassigned") return "On nothing yet";
  return doing === "meal" ? "On a meal" : "On a rest";
}
