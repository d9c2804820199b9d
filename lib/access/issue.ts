/** Letters and digits that no hand mistakes for each other: no 0 and O, 1, I and L, 5 and S, 8 and B. */
const CLEAR = "ACDEFGHJKMNPQRTUVWXYZ234679";

/** A source of chance fit for secrets: a random integer from 0 up to, not including, `below`. */
export type Draw = (below: number) => number;

/**
 * Draws a password for an account, shown once to whoever makes it: four groups of five, 95 random
 * bits, long enough for `passwordFault` however it falls.
 */
export function drawPassword(draw: Draw): string {
  return Array.from({ length: 4 }, () => drawText(draw, 5))
    .join("-")
    .toLowerCase();
}

/**
 * Draws the one-time code with which a browser becomes a kiosk: eight characters, 38 random bits for
 * ten minutes. Shown in two groups; hyphens, spaces and small letters are forgiven where it is keyed.
 */
export function drawEnrolmentCode(draw: Draw): string {
  return drawText(draw, 8);
}

/** Shows an enrolment code as it is read aloud, `K7MR-4XPT`. */
export function shownEnrolmentCode(code: string): string {
  return `${code.slice(0, 4)}-${code.slice(4)}`;
}

function drawText(draw: Draw, length: number): string {
  return Array.from({ length }, () => CLEAR[draw(CLEAR.length)]!).join("");
}
