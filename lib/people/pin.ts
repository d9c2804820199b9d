/** A PIN has six digits, made by the system at random (NIST SP 800-63B 5.1.1.1: six may be digits). */
const PIN_DIGITS = 6;

const YEARS = /^(19|20)\d\d|(19|20)\d\d$/;
/** Strokes on a number pad that a hand finds by itself: columns up and down, and the diagonals. */
const PAD_LINES = ["147", "741", "258", "852", "369", "963", "159", "951", "357", "753"];

/**
 * Says whether a PIN is too easily guessed to be given out: one or two digits only, a run up or down,
 * a block said again, pairs, a mirror, lines on the number pad, a year, or the worker's own number.
 * Common practice; a random draw meets one about once in 22 times.
 */
export function isTrivialPin(pin: string, workerNumber = ""): boolean {
  return (
    new Set(pin).size <= 2 ||
    isRun(pin) ||
    pin.slice(0, 3) === pin.slice(3) ||
    /^(\d)\1(\d)\2(\d)\3$/.test(pin) ||
    pin === [...pin].reverse().join("") ||
    (PAD_LINES.includes(pin.slice(0, 3)) && PAD_LINES.includes(pin.slice(3))) ||
    YEARS.test(pin) ||
    (workerNumber.length >= 3 && pin.includes(workerNumber))
  );
}

/**
 * Draws a PIN that is not trivial.
 *
 * @param draw gives a random integer from 0 up to, not including, its argument; from a source fit
 *   for secrets
 * @param workerNumber the number of the worker whose PIN it becomes
 */
export function drawPin(draw: (below: number) => number, workerNumber: string): string {
  const pin = String(draw(10 ** PIN_DIGITS)).padStart(PIN_DIGITS, "0");
  return isTrivialPin(pin, workerNumber) ? drawPin(draw, workerNumber) : pin;
}

/** Every step from digit to digit the same, one up or one down; 9 and 0 are neighbours. */
function isRun(pin: string): boolean {
  const steps = [...pin].slice(1).map((digit, at) => (Number(digit) - Number(pin[at]) + 10) % 10);
  return [1, 9].some((step) => steps.every((other) => other === step));
}
