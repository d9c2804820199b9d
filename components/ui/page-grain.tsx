/** The first line beside the seam, the gap after it, and how much wider each gap is than the last. */
const FIRST = 10;
const GAP = 5.5;
const WIDENS = 1.055;
const HALF = 640;

/** The grain of a page 1280 wide: lines tight at the seam and wide at the rim, on both leaves. */
function grainLines(): string {
  const lines: string[] = [];
  for (let from = FIRST, gap = GAP; from < HALF; from += gap, gap *= WIDENS) {
    lines.push(`M${(HALF - from).toFixed(1)} 0V800M${(HALF + from).toFixed(1)} 0V800`);
  }
  return lines.join("");
}

const lines = grainLines();

/** The wood of an empty page: for the door, for empty states and for print. Its parent is positioned. */
export function PageGrain() {
  return (
    <svg
      aria-hidden="true"
      className="page-grain"
      viewBox="0 0 1280 800"
      preserveAspectRatio="xMidYMid slice"
    >
      <path d={lines} vectorEffect="non-scaling-stroke" />
    </svg>
  );
}
