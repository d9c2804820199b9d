import { Fragment } from "react";
import { DayRow } from "@/components/hours/day-row";
import { HoursCells } from "@/components/hours/hours-cells";
import { Opener } from "@/components/hours/opener";
import { TapRow } from "@/components/hours/tap-row";
import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords } from "@/components/seam/verdict-tag";
import { Columns } from "@/components/shell/columns";
import type { FormAction } from "@/components/shell/use-answer";
import { Icon } from "@/components/ui/icon";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import { daySpans } from "@/lib/hours/day-spans";
import { decimalDays } from "@/lib/hours/decimal";
import type { HoursFilter } from "@/lib/hours/filter";
import type { OpenDay, OpenWorker } from "@/lib/hours/page";
import { seamScale } from "@/lib/seam/scale";
import { decimalHour } from "@/lib/time/format";

const WIDTHS = {
  number: 5,
  worker: 16,
  cell: 10,
  planned: 7,
  gauge: 24,
  present: 5,
  attended: 5.5,
  direct: 5,
  indirect: 5,
  rest: 4,
  unassigned: 6.5,
  meal: 4,
  open: 3,
};

interface LedgerProps {
  workers: readonly OpenWorker[];
  filter: HoursFilter;
  timeZone: string;
  nowSecond: number;
  linksTickets: boolean;
  /** Null for someone who may look and not correct. */
  correct: FormAction<void> | null;
}

/** Workers on one scale: planned against present, and what the time was. One opens to its days. */
export function HoursLedger({
  workers,
  filter,
  timeZone,
  nowSecond,
  linksTickets,
  correct,
}: LedgerProps) {
  const scaleSeconds = seamScale(workers.map(pairOf));
  const row = { filter, timeZone, nowSecond, linksTickets, correct };
  return (
    <Ledger caption="Hours by worker" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>No</Head>
          <Head>Worker</Head>
          <Head>Home cell</Head>
          <NumberHead>Planned</NumberHead>
          <th scope="col">
            <span className="sr-only">Planned and present</span>
            <SeamAxis scaleSeconds={scaleSeconds} unitShown />
          </th>
          <NumberHead>Present</NumberHead>
          <NumberHead>Attended</NumberHead>
          <NumberHead>Direct</NumberHead>
          <NumberHead>Indirect</NumberHead>
          <NumberHead>Rest</NumberHead>
          <NumberHead>Unassigned</NumberHead>
          <NumberHead>Meal</NumberHead>
          <th scope="col">
            <span className="sr-only">Days</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {workers.map((worker) => (
          <Fragment key={worker.worker}>
            <WorkerRow worker={worker} filter={filter} scaleSeconds={scaleSeconds} />
            {worker.days && <DayRows worker={worker.worker} days={worker.days} {...row} />}
          </Fragment>
        ))}
      </tbody>
    </Ledger>
  );
}

/** The days of the worker that is open, their strips on the same hours, and the open day's taps. */
function DayRows({
  worker,
  days,
  filter,
  timeZone,
  nowSecond,
  linksTickets,
  correct,
}: Omit<LedgerProps, "workers"> & { worker: string; days: readonly OpenDay[] }) {
  const hours = decimalDays(days.map(({ sums }) => sums));
  const cut = days.map((day) => ({
    ...day,
    stretches: day.stretches.map((each) => ({ ...each, end: Math.min(each.end, nowSecond) })),
  }));
  const spans = daySpans(cut);
  return cut.map((day, index) => (
    <Fragment key={day.date}>
      <DayRow
        day={day}
        hours={hours[index]!}
        filter={filter}
        span={spans[index]!}
        timeZone={timeZone}
      />
      {day.taps.map((line) => (
        <TapRow
          key={line.tap.id}
          line={line}
          correcting={correct && { worker, action: correct }}
          timeZone={timeZone}
          nowSecond={nowSecond}
          linksTickets={linksTickets}
        />
      ))}
    </Fragment>
  ));
}

function WorkerRow({
  worker,
  filter,
  scaleSeconds,
}: {
  worker: OpenWorker;
  filter: HoursFilter;
  scaleSeconds: number;
}) {
  const isOpen = worker.days !== null;
  const [hours] = decimalDays([worker.sums]);
  return (
    <tr data-open={isOpen ? "" : undefined}>
      <td data-book="" className="code text-ink-2">
        {worker.worker}
      </td>
      <td data-book="" className="desk-cut">
        {worker.looseEnds > 0 && (
          <span className="tag pr-2 text-danger" title="Records or gaps that a person must settle">
            <Icon name="loose" /> {worker.looseEnds}
            <span className="sr-only"> to look at, </span>
          </span>
        )}
        <bdi className="font-[650]">{worker.name}</bdi>
        {worker.runs && <span className="text-ink-2"> in now</span>}
      </td>
      <td data-book="" className="desk-cut text-ink-2">
        {worker.cell}
      </td>
      <NumberCell data-book="" data-standard="" data-label="planned">
        {worker.plannedSeconds === null ? "none" : decimalHour(worker.plannedSeconds)}
      </NumberCell>
      <td data-gauge="">
        <SeamGauge
          {...pairOf(worker)}
          flush
          size="cell"
          state={worker.runs ? "live" : "finished"}
          scaleSeconds={scaleSeconds}
          words={hourWords}
          name={`${worker.name}, planned and present`}
        />
      </td>
      <NumberCell data-day="" data-actual="" data-half="left" data-label="present">
        {decimalHour(worker.sums.spanSeconds)}
      </NumberCell>
      <HoursCells hours={hours!} />
      <td data-day="" data-half="right">
        <Opener
          filter={{ ...filter, worker: isOpen ? "" : worker.worker, day: "" }}
          isOpen={isOpen}
          label={`Days of ${worker.name}`}
        />
      </td>
    </tr>
  );
}

function pairOf({ plannedSeconds, sums }: OpenWorker) {
  return { standardSeconds: plannedSeconds, actualSeconds: sums.spanSeconds };
}
