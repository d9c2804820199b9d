/** Blank modules on either side, without which scanners do not find the code (ISO/IEC 15417: 10). */
const QUIET = 10;

/** A Code 128 bar code, drawn to any size without blur; its text belongs beside it in words. */
export function BarCode({
  bars,
  label,
  className = "",
}: {
  /** Widths in modules: bar, gap, bar, … */
  bars: readonly number[];
  label: string;
  className?: string;
}) {
  let x = QUIET;
  let path = "";
  for (const [at, width] of bars.entries()) {
    if (at % 2 === 0) path += `M${x} 0h${width}v1h-${width}z`;
    x += width;
  }
  return (
    <svg
      viewBox={`0 0 ${x + QUIET} 1`}
      preserveAspectRatio="none"
      shapeRendering="crispEdges"
      className={`code-print ${className}`}
      role="img"
      aria-label={label}
    >
      <path d={path} />
    </svg>
  );
}
