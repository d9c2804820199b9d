import { TicketLink } from "@/components/tickets/ticket-link";
import type { OpenStandard } from "@/lib/replay/page";
import { dateText } from "@/lib/time/format";

/** As many numbers as a sentence bears; the tickets page has them all. */
const SHOWN = 6;

/** What setting the draft does, in sentences: which tickets take it, and which keep theirs. */
export function EffectWords({ open }: { open: OpenStandard }) {
  const { effect, drafted, cell, leavesSetupOut } = open;
  if (!effect || !drafted?.entry) return null;
  const { takes, keeps, again, plannedSeconds } = effect;
  const day = dateText(drafted.entry.effectiveFrom);
  const hours = (Math.abs(plannedSeconds) / 3600).toFixed(1);
  return (
    <section>
      <h3 className="text-t-4">When it takes effect</h3>
      <ul className="standards-effect">
        <li>
          {takes.length === 0
            ? "No open ticket is still to begin this operation."
            : `${tickets(takes)} still to begin it ${takes.length === 1 ? "takes" : "take"} it from ${day} on` +
              `; the plan of ${cell} ${plannedSeconds < 0 ? "shrinks" : "grows"} by ${hours} h.`}
          <Numbers numbers={takes} />
        </li>
        {keeps.length > 0 && (
          <li>
            {tickets(keeps)} already begun {keeps.length === 1 ? "keeps its" : "keep their"}{" "}
            standard to the end.
            <Numbers numbers={keeps} />
          </li>
        )}
        {again.length > 0 && (
          <li>
            {tickets(again)} begun since {day} {again.length === 1 ? "is" : "are"} earned again at
            it, finished or not.
            <Numbers numbers={again} />
          </li>
        )}
        <li>What began before {day} does not move.</li>
        {leavesSetupOut && (
          <li>One setup serves several lots here, so the replay compares run time only.</li>
        )}
      </ul>
    </section>
  );
}

const tickets = ({ length }: readonly string[]) =>
  `${length} ${length === 1 ? "ticket" : "tickets"}`;

function Numbers({ numbers }: { numbers: readonly string[] }) {
  if (numbers.length === 0) return null;
  const more = numbers.length - SHOWN;
  return (
    <span className="block text-t-2">
      {numbers.slice(0, SHOWN).map((number) => (
        <span key={number} className="mr-3 inline-block">
          <TicketLink number={number} links />
        </span>
      ))}
      {more > 0 && <span className="text-ink-2">and {more} more</span>}
    </span>
  );
}
