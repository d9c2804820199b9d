import { dotPlot } from "@/lib/replay/dot-plot";
import type { OpenStandard } from "@/lib/replay/page";
import { minutesText } from "@/lib/standards/minutes";

const WIDTH = 600;
const HEIGHT = 130;
const FLOOR = 100;
const DOT = 5;

/** Each finished ticket's minutes a piece as a dot, with the standard in force and the draft. */
export function PiecesPlot({
  open,
  secondsPerPiece,
}: {
  open: OpenStandard;
  secondsPerPiece: readonly number[];
}) {
  const draft = open.drafted?.entry;
  const holds = open.history.find(({ state }) => state === "in-force");
  if (!draft || open.option !== null || secondsPerPiece.length === 0) return <div />;
  const lines = [
    { seconds: draft.runSeconds, words: `${minutesText(draft.runSeconds)} draft`, is: "draft" },
    ...(holds
      ? [{ seconds: holds.runSeconds, words: `${minutesText(holds.runSeconds)} now`, is: "now" }]
      : []),
  ];
  const plot = dotPlot(secondsPerPiece, { lines: lines.map(({ seconds }) => seconds) });
  const x = (seconds: number) => (seconds / plot.scaleSeconds) * (WIDTH - 20) + 10;
  const low = Math.min(...lines.map(({ seconds }) => seconds));
  return (
    <figure className="standards-plot">
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        role="img"
        aria-label={`Minutes a piece of ${secondsPerPiece.length} finished tickets, from ${minutesText(Math.round(Math.min(...secondsPerPiece)))} to ${minutesText(Math.round(Math.max(...secondsPerPiece)))}`}
      >
        {lines.map(({ seconds, words, is }) => (
          <g key={is} data-line={is}>
            <path d={`M${x(seconds)} 16V${FLOOR + 6}`} />
            <text
              x={x(seconds) + (seconds === low ? -5 : 5)}
              y="14"
              textAnchor={seconds === low ? "end" : "start"}
            >
              {words}
            </text>
          </g>
        ))}
        {plot.dots.map(({ bin, height }) => (
          <circle
            key={`${bin} ${height}`}
            cx={x((bin + 0.5) * plot.binSeconds)}
            cy={FLOOR - DOT - height * plot.step}
            r={DOT - 0.5}
          />
        ))}
        <path data-floor="" d={`M0 ${FLOOR}H${WIDTH}`} />
        {plot.marks.map((seconds) => (
          <text key={seconds} data-mark="" x={x(seconds)} y={HEIGHT - 10} textAnchor="middle">
            {seconds / 60}
          </text>
        ))}
      </svg>
      <figcaption className="text-t-2 text-ink-2">
        min a piece, setup included; each dot one finished ticket
      </figcaption>
    </figure>
  );
}
