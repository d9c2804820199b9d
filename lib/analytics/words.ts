const oneDecimal = new Intl.NumberFormat("en-GB", {
  minimumFractionDigits: 1,
  maximumFractionDigits: 1,
});
const whole = new Intl.NumberFormat("en-GB", { maximumFractionDigits: 0 });

/** Seconds as hours with one decimal: 4,412,640 is "1,225.7". */
export function hoursOf(seconds: number): string {
  return oneDecimal.format(seconds / 3600);
}

/** Seconds as hours with a sign, for what grew or shrank: "+12.5", "−3.0", "0.0". */
export function signedHours(seconds: number): string {
  const hours = hoursOf(Math.abs(seconds));
  if (hours === "0.0") return hours;
  return `${seconds < 0 ? "−" : "+"}${hours}`;
}

/** A ratio in whole percent, "94 %"; a dash where there is none. */
export function percentOf(ratio: number | null): string {
  return ratio === null ? "–" : `${whole.format(ratio * 100)} %`;
}

/** A ratio in percent with one decimal, for the head of a page. */
export function finePercentOf(ratio: number | null): string {
  return ratio === null ? "–" : `${oneDecimal.format(ratio * 100)} %`;
}

/** What a piece takes in minutes with one decimal; empty without pieces. */
export function minutesEach(seconds: number, pieces: number): string {
  return pieces > 0 ? oneDecimal.format(seconds / pieces / 60) : "";
}

/** A count of pieces: "2,071". */
export function countOf(pieces: number): string {
  return whole.format(pieces);
}
