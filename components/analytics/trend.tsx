import { drawTrend } from "@/lib/analytics/trend";
import { percentOf } from "@/lib/analytics/words";

const SIZE = { width: 92, height: 14 };

/** Efficiency of the last eight weeks on a scale of its own, with the target dotted. */
export function Trend({ values }: { values: readonly (number | null)[] }) {
  const { lines, targetY, last } = drawTrend(values, SIZE);
  if (!last) return <span className="text-ink-2">no history</span>;
  const spoken = values.map((value) => (value === null ? "nothing" : percentOf(value))).join(", ");
  return (
    <svg
      role="img"
      aria-label={`Efficiency by week, the oldest first: ${spoken}`}
      viewBox={`-4 -4 ${SIZE.width + 8} ${SIZE.height + 8}`}
      preserveAspectRatio="none"
      className="trend"
    >
      <line x1={0} x2={SIZE.width} y1={targetY} y2={targetY} className="trend-target" />
      {lines.map((points) => (
        <polyline
          key={points[0]!.x}
          points={points.map(({ x, y }) => `${x.toFixed(1)},${y.toFixed(1)}`).join(" ")}
        />
      ))}
      <line x1={last.x} x2={last.x} y1={last.y} y2={last.y} className="trend-last" />
    </svg>
  );
}
