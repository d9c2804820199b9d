import { placeStretches, type Stretch, type StripSpan } from "@/lib/seam/day-strip";

/**
 * One day of one person in clock time, left to right; it stays on the day leaf and is never
 * mirrored. `label` says in words what it shows, such as `07:00 to 15:12, 6.9 h on tickets`.
 * `planned` is drawn as a spruce line beneath, `nowAt` as a mark.
 */
export function DayStrip({
  stretches,
  span,
  label,
  planned,
  nowAt,
  className = "",
}: {
  stretches: readonly Stretch[];
  /** from `stripSpan`, or one span for all strips of a list */
  span: StripSpan;
  label: string;
  planned?: StripSpan;
  nowAt?: number;
  className?: string;
}) {
  const placed = placeStretches(stretches, span);
  const [plan] = planned
    ? placeStretches([{ start: planned.from, end: planned.to, kind: "work" }], span)
    : [];
  const now = nowAt === undefined ? null : ((nowAt - span.from) / (span.to - span.from)) * 100;
  return (
    <span role="img" aria-label={label} className={`strip ${className}`}>
      {placed.map(({ kind, left, width }) => (
        <i key={left} data-kind={kind} style={{ left: `${left}%`, width: `${width}%` }} />
      ))}
      {plan && <i data-planned="" style={{ left: `${plan.left}%`, width: `${plan.width}%` }} />}
      {now !== null && now >= 0 && now <= 100 && <i data-now="" style={{ left: `${now}%` }} />}
    </span>
  );
}
