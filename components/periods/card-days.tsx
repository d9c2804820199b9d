import { DayStrip } from "@/components/seam/day-strip";
import { NumberCell } from "@/components/ui/table";
import type { ShownDay } from "@/lib/periods/shown-days";
import { stripSpan } from "@/lib/seam/day-strip";
import { clockText, dayText } from "@/lib/time/format";

/** The days of a card: the strip as it was worked, tapped and paid side by side, and why. */
export function CardDays({ days, timeZone }: { days: readonly ShownDay[]; timeZone: string }) {
  return days.map((day) => <DayLine key={day.key} day={day} timeZone={timeZone} />);
}

function DayLine({ day, timeZone }: { day: ShownDay; timeZone: string }) {
  const { date, policy, hours, trail, warnings, stretches, reference } = day;
  const [first, last] = [stretches[0], stretches.at(-1)];
  const clock = (second: number) => clockText(second * 1000, timeZone);
  const words = first && last ? `${clock(first.start)} to ${clock(last.end)}` : "no time now";
  return (
    <>
      <tr data-line="">
        <td data-book="" data-spare="" />
        <td data-book="" className="font-[650]">
          {dayText(date, "en-GB")}
        </td>
        <td data-book="" colSpan={2} className="desk-cut text-right text-ink-2">
          {reference ? `changes ${reference}` : `by ${policy}`}
        </td>
        <td className="period-strip">
          {stretches.length > 0 ? (
            <DayStrip
              stretches={stretches}
              span={stripSpan(stretches)}
              label={`${words}, ${hours.worked} hours tapped`}
            />
          ) : (
            <span>{words}</span>
          )}
        </td>
        <NumberCell data-day="" data-actual="" data-label="tapped">
          {hours.worked}
        </NumberCell>
        <NumberCell data-day="" data-label="paid" className="font-[650]">
          {hours.paid}
        </NumberCell>
        <NumberCell data-day="" data-label="overtime">
          {hours.overtime === "0.00" ? "" : hours.overtime}
        </NumberCell>
        <NumberCell data-day="" data-label="double">
          {hours.double === "0.00" ? "" : hours.double}
        </NumberCell>
        <td data-day="" colSpan={4} className="desk-cut text-ink-2">
          {words}
        </td>
      </tr>
      {(trail.length > 0 || warnings.length > 0) && (
        <tr data-line="" className="period-why">
          <td data-book="" colSpan={4} className="text-right text-ink-2">
            why
          </td>
          <td className="hours-tap" colSpan={9}>
            {trail.map(({ rule, text }) => (
              <span key={`${rule} ${text}`} className="mr-3">
                {text}
              </span>
            ))}
            {warnings.map((text) => (
              <span key={text} className="mr-3 font-[650] text-danger">
                {text}
              </span>
            ))}
          </td>
        </tr>
      )}
    </>
  );
}
