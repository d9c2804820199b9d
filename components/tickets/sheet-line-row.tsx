import { actualMinutes } from "@/lib/seam/verdict";
import type { SheetLine } from "@/lib/tickets/sheet";
import { clockText, dayText } from "@/lib/time/format";
import { instantMs } from "@/lib/time/instant";
import { localDate } from "@/lib/time/site-day";

/** One thing behind a figure: a stretch that someone worked, or a count that someone made. */
export function SheetLineRow({ line, timeZone }: { line: SheetLine; timeZone: string }) {
  const startMs = instantMs(line.line === "segment" ? line.start : line.at) ?? 0;
  const day = dayText(localDate(startMs, timeZone), "en-GB");
  return (
    <tr data-line="">
      <td data-book="" data-spare="" />
      <td data-book="" className="desk-cut">
        <bdi>{line.worker?.name}</bdi>
      </td>
      <td data-book="" className="text-ink-2">
        {line.worker?.worker}
      </td>
      <td data-book="" className="text-ink-2 text-right">
        {line.line === "segment" ? line.activity : "counted"}
      </td>
      <td className="desk-line-day">
        <span>
          {day}, {clockText(startMs, timeZone)}
          {line.line === "segment" && ` to ${endOf(line.end, timeZone)}`}
        </span>
      </td>
      <td data-day="" data-number="" data-actual="">
        {line.line === "segment" && line.seconds !== null && actualMinutes(line.seconds)}
      </td>
      <td data-day="" colSpan={2}>
        {line.line === "report" ? countOf(line) : line.said ? "start said, not tapped" : ""}
      </td>
      <td data-day="" className="text-ink-2">
        {line.cell}
      </td>
    </tr>
  );
}

function endOf(end: string | null, timeZone: string): string {
  return end === null ? "now" : clockText(instantMs(end) ?? 0, timeZone);
}

function countOf(line: SheetLine & { line: "report" }): string {
  const { good, rework, scrap, stop, causedBy } = line;
  const counts = [
    `${good} good`,
    rework > 0 && `${rework} rework`,
    scrap > 0 && `${scrap} scrap`,
    causedBy && `caused by ${causedBy}`,
    stop && "done",
  ];
  return counts.filter(Boolean).join(", ");
}
