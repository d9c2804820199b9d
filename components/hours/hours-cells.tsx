import { NumberCell } from "@/components/ui/table";
import type { DecimalDay } from "@/lib/hours/decimal";

/** The hours of a line by what they were; direct, indirect, rest and unassigned make attended. */
export function HoursCells({ hours }: { hours: DecimalDay }) {
  return (
    <>
      <NumberCell data-day="" data-half="right" data-label="attended" className="font-[650]">
        {hours.attended}
      </NumberCell>
      <NumberCell data-day="" data-half="left" data-label="direct">
        {hours.direct}
      </NumberCell>
      <NumberCell data-day="" data-half="right" data-label="indirect">
        {hours.indirect}
      </NumberCell>
      <NumberCell data-day="" data-half="left" data-label="rest">
        {hours.rest}
      </NumberCell>
      <NumberCell data-day="" data-half="right" data-label="unassigned">
        {hours.unassigned}
      </NumberCell>
      <NumberCell data-day="" data-half="left" data-label="meal">
        {hours.meal}
      </NumberCell>
    </>
  );
}
