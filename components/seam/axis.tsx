import { axisMarks, axisUnit } from "@/lib/seam/axis";

/**
 * The scale under or above gauges: the same marks on both leaves, mirrored. `unit` words follow
 * the outermost mark of the day leaf; a drawing that is one of many needs its scale only once.
 */
export function SeamAxis({
  scaleSeconds,
  unitShown = false,
  className = "",
}: {
  scaleSeconds: number;
  unitShown?: boolean;
  className?: string;
}) {
  const marks = axisMarks(scaleSeconds);
  const unit = axisUnit(marks);
  return (
    <span aria-hidden className={`seam-axis block ${className}`}>
      {marks.map((mark) => {
        const figure = mark / (unit === "h" ? 3600 : 60);
        const share = (mark / scaleSeconds) * 50;
        return [
          <span key={-mark} style={{ left: `${50 - share}%` }}>
            {figure}
          </span>,
          <span key={mark} style={{ left: `${50 + share}%` }}>
            {figure}
            {unitShown && mark === marks.at(-1) ? ` ${unit}` : ""}
          </span>,
        ];
      })}
    </span>
  );
}
