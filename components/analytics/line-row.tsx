import type { ReactNode } from "react";
import { Trend } from "@/components/analytics/trend";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords, VerdictTag } from "@/components/seam/verdict-tag";
import { NumberCell } from "@/components/ui/table";
import type { SeamLine } from "@/lib/analytics/lines";
import { countOf, hoursOf, minutesEach, percentOf } from "@/lib/analytics/words";

interface LineProps {
  line: SeamLine;
  /** What it is of: a code and a name, or a name alone. */
  code?: string;
  name: ReactNode;
  spoken: string;
  scaleSeconds: number;
  isOpen?: boolean;
  isUnder?: boolean;
  opener?: ReactNode;
  isTrended?: boolean;
}

/** A line on the seam: earned left, actual right. What has no standard is a line of its own. */
export function LineRow(props: LineProps) {
  const { line, spoken, scaleSeconds, isOpen = false, isUnder = false } = props;
  const { pair, work } = line;
  if (!pair) return <BlankRow {...props} opener={props.opener} />;
  return (
    <>
      <tr data-open={isOpen ? "" : undefined} data-line={isUnder ? "" : undefined}>
        <Named {...props} />
        <NumberCell data-book="" data-label="pieces">
          {work.pieces > 0 && countOf(work.pieces)}
        </NumberCell>
        <NumberCell data-book="" data-label="std min">
          {minutesEach(pair.standardSeconds ?? 0, work.pieces)}
        </NumberCell>
        <NumberCell data-book="" data-standard="" data-label="earned">
          {hoursOf(work.earnedSeconds)}
        </NumberCell>
        <td data-gauge="">
          <SeamGauge
            {...pair}
            flush
            size="cell"
            scaleSeconds={scaleSeconds}
            words={hourWords}
            name={spoken}
          />
        </td>
        <NumberCell data-day="" data-actual="" data-label="actual">
          {hoursOf(pair.actualSeconds)}
        </NumberCell>
        <td data-day="">
          <VerdictTag pair={pair} finished words={hourWords} />
        </td>
        <NumberCell data-day="" data-label="efficiency">
          <b>{percentOf(line.efficiency)}</b>
        </NumberCell>
        <td data-day="">{props.isTrended && <Trend values={line.trend} />}</td>
        <td data-day="">{props.opener}</td>
      </tr>
      {work.noStandardSeconds > 0 && <BlankRow {...props} opener={null} />}
    </>
  );
}

function Named({ code, name }: Pick<LineProps, "code" | "name">) {
  return (
    <>
      <td data-book="" className="code text-ink-2">
        {code}
      </td>
      <td data-book="" className="desk-cut">
        {name}
      </td>
    </>
  );
}

/** Time without a standard: a dotted empty leaf, left out of efficiency, and said. */
function BlankRow({ line, spoken, scaleSeconds, isUnder = false, ...props }: LineProps) {
  const { work, pair } = line;
  const blank = { standardSeconds: null, actualSeconds: work.noStandardSeconds };
  return (
    <tr data-line={isUnder ? "" : undefined}>
      <Named {...props} />
      <NumberCell data-book="" data-label="pieces">
        {!pair && work.pieces > 0 && countOf(work.pieces)}
      </NumberCell>
      <NumberCell data-book="" data-label="std min" className="text-ink-2">
        none
      </NumberCell>
      <NumberCell data-book="" />
      <td data-gauge="">
        <SeamGauge
          {...blank}
          flush
          size="cell"
          scaleSeconds={scaleSeconds}
          words={hourWords}
          name={spoken}
        />
      </td>
      <NumberCell data-day="" data-actual="" data-label="actual">
        {hoursOf(work.noStandardSeconds)}
      </NumberCell>
      <td data-day="">
        <VerdictTag pair={blank} finished words={hourWords} />
      </td>
      <NumberCell data-day="" className="text-ink-2">
        left out
      </NumberCell>
      <td data-day="" />
      <td data-day="">{props.opener}</td>
    </tr>
  );
}
