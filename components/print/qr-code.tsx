/** Blank modules around it, without which scanners do not find the code (ISO/IEC 18004: 4). */
const QUIET = 4;

/** A QR code, drawn to any size without blur; it reads at any angle. */
export function QrCode({
  dots,
  label,
  className = "",
}: {
  /** Rows of modules; true is dark. */
  dots: readonly (readonly boolean[])[];
  label: string;
  className?: string;
}) {
  const side = dots.length + 2 * QUIET;
  const path = dots
    .flatMap((row, y) => row.map((dark, x) => (dark ? `M${x + QUIET} ${y + QUIET}h1v1h-1z` : "")))
    .join("");
  return (
    <svg
      viewBox={`0 0 ${side} ${side}`}
      shapeRendering="crispEdges"
      className={`code-print ${className}`}
      role="img"
      aria-label={label}
    >
      <path d={path} />
    </svg>
  );
}
