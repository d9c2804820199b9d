const MINUTE = 60;
const HOUR = 3600;

/** What a mark on the axis may be a multiple of. */
const STEPS = [1, 2, 5, 10, 20, 30, 60, 120, 240, 480, 960, 2400].map((step) => step * MINUTE);

/** More than this many marks on a leaf would be a ruler, not a scale. */
const MARKS_MAX = 4;

/**
 * Lists the marks of a leaf, in seconds from the seam outwards, at most four: multiples of the
 * smallest round step that allows it. The seam itself is 0 and needs no mark.
 */
export function axisMarks(scaleSeconds: number): number[] {
  const widest = STEPS.at(-1)!;
  const step =
    STEPS.find((each) => scaleSeconds / each < MARKS_MAX + 1) ??
    Math.ceil(scaleSeconds / MARKS_MAX / widest) * widest;
  return Array.from({ length: Math.floor(scaleSeconds / step) }, (_, mark) => (mark + 1) * step);
}

/** The unit of an axis: minutes, or hours where its last mark is at least two. */
export function axisUnit(marks: readonly number[]): "min" | "h" {
  const whole = marks.every((mark) => mark % HOUR === 0);
  return whole && (marks.at(-1) ?? 0) >= 2 * HOUR ? "h" : "min";
}
