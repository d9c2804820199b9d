import { HoursCells } from "@/components/hours/hours-cells";
import { Opener } from "@/components/hours/opener";
import { StripHours } from "@/components/hours/strip-hours";
import { DayStrip } from "@/components/seam/day-strip";
import { NumberCell } from "@/components/ui/table";
import type { DecimalDay } from "@/lib/hours/decimal";
import type { HoursFilter } from "@/lib/hours/filter";
import type { OpenDay } from "@/lib/hours/page";
import type { StripSpan } from "@/lib/seam/day-strip";
import { clockText, dayText, decimalHour } from "@/lib/time/format";

/** One day of the worker that is open: planned on the left, the day strip and the hours right. */
export function DayRow({
  day,
  hours,
  filter,
  span: shownSpan,
  timeZone,
}: {
  /** With its stretches cut to now. */
  day: OpenDay;
  hours: DecimalDay;
  filter: HoursFilter;
  /** One for all days of the worker. */
  span: StripSpan;
  timeZone: string;
}) {
  const { date, planned, isOpen, runs, stretches } = day;
  const [first, last] = [stretches[0], stretches.at(-1)];
  const clock = (second: number) => clockText(second * 1000, timeZone);
  const span = first && last ? `${clock(first.start)} to ${runs ? "now" : clock(last.end)}` : "";
  const strip = (className: string) => (
    <DayStrip
      stretches={stretches}
      span={shownSpan}
      label={`${span}, ${hours.attended} hours attended`}
      className={className}
      {...(planned ? { planned } : {})}
    />
  );
  return (
    <>
      <tr data-line="">
        <td data-book="" data-spare="" />
        <td data-book="" className="font-[650]">
          {dayText(date, "en-GB")}
        </td>
        <td data-book="" colSpan={2} className="text-right text-ink-2">
          {planned ? `planned ${clock(planned.from)} to ${clock(planned.to)}` : "nothing planned"}
        </td>
        <td data-strip="">
          {isOpen ? <span className="hours-side">{span}</span> : strip("hours-side")}
        </td>
        <NumberCell data-day="" data-actual="" data-half="left" data-label="present">
          {decimalHour(day.sums.spanSeconds)}
        </NumberCell>
        <HoursCells hours={hours} />
        <td data-day="" data-half="right">
          <Opener
            filter={{ ...filter, day: isOpen ? "" : date }}
            isOpen={isOpen}
            label={`Taps of ${dayText(date, "en-GB")}`}
          />
        </td>
      </tr>
      {isOpen && (
        <tr data-line="">
          <td data-book="" colSpan={4} className="text-right text-ink-2">
            Every record behind these figures, as it was tapped
          </td>
          <td className="hours-tap" colSpan={9}>
            {strip("hours-day")}
            <StripHours span={shownSpan} timeZone={timeZone} />
          </td>
        </tr>
      )}
    </>
  );
}
