import Link from "next/link";
import type { ReactNode } from "react";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords } from "@/components/seam/verdict-tag";
import { Icon } from "@/components/ui/icon";
import { NumberCell } from "@/components/ui/table";
import type { CardLine } from "@/lib/periods/cards-view";
import type { CardsFilter } from "@/lib/periods/schema";
import { decimalHour } from "@/lib/time/format";

/** One worker's card: planned and tapped about the seam, what is paid, and who has signed. */
export function CardRow({
  line,
  filter,
  scaleSeconds,
  days,
}: {
  line: CardLine;
  filter: CardsFilter;
  scaleSeconds: number;
  days: ReactNode;
}) {
  const { worker, state, plannedSeconds, tappedSeconds, hours, toLookAt } = line;
  const isOpen = days !== null;
  const isLoose = state === "to look at" && toLookAt !== "waits for the lead";
  return (
    <>
      <tr data-open={isOpen ? "" : undefined}>
        <td data-book="" className="code text-ink-2">
          {worker.number}
        </td>
        <td data-book="" className="desk-cut font-[650]">
          {worker.name}
        </td>
        <td data-book="" className="desk-cut text-ink-2">
          {worker.cell}
        </td>
        <NumberCell data-book="" data-standard="" data-label="planned">
          {plannedSeconds === null ? "none" : decimalHour(plannedSeconds)}
        </NumberCell>
        <td data-gauge="">
          <SeamGauge
            standardSeconds={plannedSeconds}
            actualSeconds={tappedSeconds}
            flush
            size="cell"
            scaleSeconds={scaleSeconds}
            words={hourWords}
            name={`${worker.name}, planned and tapped`}
          />
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
        <td data-day="" className={`desk-cut ${isLoose ? "text-danger" : "text-ink-2"}`}>
          <span title={toLookAt}>
            {isLoose && <Icon name="loose" />} {toLookAt}
          </span>
        </td>
        <Signed by="self" is={line.signedByWorker} />
        <Signed by="lead" is={line.signedByLead} />
        <td data-day="">
          <Link
            href={`/hours/cards?${addressOf({ ...filter, worker: isOpen ? "" : worker.number })}`}
            scroll={false}
            className="desk-opener"
            aria-expanded={isOpen}
            aria-label={`Card of ${worker.name}`}
          >
            <Icon name={isOpen ? "up" : "down"} />
          </Link>
        </td>
      </tr>
      {days}
    </>
  );
}

function Signed({ by, is }: { by: string; is: boolean }) {
  return (
    <td data-day="" data-label={by}>
      <span className="sr-only">{is ? `signed by ${by}` : `not signed by ${by}`}</span>
      {is ? <Icon name="good" /> : <span aria-hidden="true" className="period-box" />}
    </td>
  );
}

function addressOf(filter: CardsFilter): URLSearchParams {
  return new URLSearchParams(Object.entries(filter).filter(([, value]) => value !== ""));
}
