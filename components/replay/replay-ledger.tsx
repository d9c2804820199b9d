import { EffectWords } from "@/components/replay/effect-words";
import { PiecesPlot } from "@/components/replay/pieces-plot";
import { SeamAxis } from "@/components/seam/axis";
import { SeamGauge } from "@/components/seam/gauge";
import { hourWords, VerdictTag } from "@/components/seam/verdict-tag";
import { Columns } from "@/components/shell/columns";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import type { OpenStandard } from "@/lib/replay/page";
import type { Replay, ReplaySums, ReplayWeek } from "@/lib/replay/replay";
import { seamScale } from "@/lib/seam/scale";
import { dayText } from "@/lib/time/format";

const WIDTHS = {
  week: 16,
  pieces: 7,
  was: 7,
  would: 8,
  gauge: 24,
  actual: 8,
  word: 14,
  efficiency: 16,
};

const hours = (seconds: number) => (seconds / 3600).toFixed(1);
const percent = (share: number | null) => (share === null ? "–" : `${Math.round(share * 100)} %`);

/** The last four weeks at the drafted standard, week by week, and what setting it will do. */
export function ReplayLedger({ open, replay }: { open: OpenStandard; replay: Replay }) {
  const { total, weeks } = replay;
  const pairs = weeks.map(({ wouldSeconds, wasSeconds, actualSeconds }) => ({
    standardSeconds: Math.max(wouldSeconds, wasSeconds ?? 0),
    actualSeconds,
  }));
  const scaleSeconds = seamScale(pairs);
  return (
    <section aria-label="Replay" className="standards-replay">
      <header className="desk-figures">
        <div>
          <h2 className="mr-auto text-t-5">
            Replay: the last four weeks
            <br />
            at the drafted standard
          </h2>
          <p className="desk-figure text-standard-ink">
            <span>
              earned,
              <br /> was {total.wasSeconds === null ? "none" : hours(total.wasSeconds)}
            </span>
            <b>{hours(total.wouldSeconds)}</b>
          </p>
        </div>
        <div>
          <p className="desk-figure text-actual">
            <b>{hours(total.actualSeconds)}</b>
            <span>
              actual
              <br /> hours
            </span>
          </p>
          <p className="ml-auto text-right">
            <b className="text-t-6">{changeWords(total)}</b>
            <br />
            efficiency on this operation, finished work
          </p>
        </div>
      </header>
      <Ledger caption="Replay by week" className="mirror-ledger">
        <Columns widths={WIDTHS} />
        <thead>
          <tr>
            <Head>Finished in</Head>
            <NumberHead>Pieces</NumberHead>
            <NumberHead>Was, h</NumberHead>
            <NumberHead>Would be, h</NumberHead>
            <th scope="col">
              <span className="sr-only">Earned at the draft, and actual</span>
              <SeamAxis scaleSeconds={scaleSeconds} unitShown />
            </th>
            <NumberHead>Actual, h</NumberHead>
            <Head>Over or under then</Head>
            <NumberHead>Efficiency</NumberHead>
          </tr>
        </thead>
        <tbody>
          {weeks.map((week) => (
            <WeekRow key={week.from} week={week} scaleSeconds={scaleSeconds} />
          ))}
        </tbody>
      </Ledger>
      <div className="desk-pair">
        <EffectWords open={open} />
        <PiecesPlot open={open} secondsPerPiece={replay.secondsPerPiece} />
      </div>
    </section>
  );
}

function WeekRow({ week, scaleSeconds }: { week: ReplayWeek; scaleSeconds: number }) {
  const { from, to, pieces, wasSeconds, wouldSeconds, actualSeconds } = week;
  const pair = { standardSeconds: wouldSeconds, actualSeconds };
  const isWorked = pieces > 0 || actualSeconds > 0;
  return (
    <tr>
      <td data-book="" className="font-[650]">
        {dayText(from, "en-GB").slice(4)} to {dayText(to, "en-GB").slice(4)}
      </td>
      <NumberCell data-book="" data-label="pieces">
        {pieces}
      </NumberCell>
      <NumberCell data-book="" data-label="was" className="text-ink-2">
        {wasSeconds === null ? "none" : hours(wasSeconds)}
      </NumberCell>
      <NumberCell data-book="" data-standard="" data-label="would be">
        {hours(wouldSeconds)}
      </NumberCell>
      <td data-gauge="">
        {isWorked && (
          <span className="standards-gauge">
            <SeamGauge
              {...pair}
              flush
              scaleSeconds={scaleSeconds}
              words={hourWords}
              name={`Week from ${from}`}
            />
            {wasSeconds !== null && <WasMark share={wasSeconds / scaleSeconds} />}
          </span>
        )}
      </td>
      <NumberCell data-day="" data-actual="" data-label="actual">
        {isWorked && hours(actualSeconds)}
      </NumberCell>
      <td data-day="">
        {isWorked ? (
          <VerdictTag pair={pair} finished words={hourWords} />
        ) : (
          <span className="text-ink-2">nothing finished</span>
        )}
      </td>
      <NumberCell data-day="" className="font-[650]">
        {isWorked && changeWords(week)}
      </NumberCell>
    </tr>
  );
}

/** Where the standard of the time stood, mirrored about the seam. */
function WasMark({ share }: { share: number }) {
  const left = Math.min(1, share) * 50;
  return (
    <>
      <i aria-hidden className="standards-was" style={{ left: `${50 - left}%` }} />
      <i aria-hidden className="standards-was" style={{ left: `${50 + left}%` }} />
    </>
  );
}

function changeWords({ wasEfficiency, wouldEfficiency }: ReplaySums): string {
  return `${percent(wasEfficiency)} → ${percent(wouldEfficiency)}`;
}
