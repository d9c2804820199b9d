import { type Forgotten, PersonName } from "@/components/floor/person-name";
import { SeamGauge } from "@/components/seam/gauge";
import type { PresentElsewhere } from "@/lib/floor/schema";
import { otherWorkWords } from "@/lib/ledger/other-work-words";
import { actualMinutes } from "@/lib/seam/verdict";
import { clockText } from "@/lib/time/format";

/** People who are in and on no ticket: one on other work, or all who are on the same break. */
export function ElsewhereRow({
  people,
  now,
  scaleSeconds,
  timeZone,
  forgotten,
}: {
  /** At least one, all doing the same. */
  people: readonly PresentElsewhere[];
  now: number;
  scaleSeconds: number;
  timeZone: string;
  forgotten: Forgotten | null;
}) {
  const { doing, code, since } = people[0]!;
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
      <td data-day="">
        {people.length === 1 ? `${actualMinutes(seconds)} min` : `${people.length} people`}
      </td>
      <td data-day="" className="desk-wrap">
        {people.map((person, index) => (
          <span key={person.worker}>
            {index > 0 && "; "}
            <span className="text-ink">
              <PersonName
                person={person}
                deed="shift-end"
                proposedSecond={now}
                timeZone={timeZone}
                forgotten={forgotten}
              />
            </span>
            , since {clockText(person.since * 1000, timeZone)}
          </span>
        ))}
      </td>
    </tr>
  );
}

function words(doing: PresentElsewhere["doing"], code: string | null): string {
  if (doing === "indirect") return `Other work: ${otherWorkWords(code)}`;
  if (doing === "unassigned") return "On nothing yet";
  return doing === "meal" ? "On a meal" : "On a rest";
}
