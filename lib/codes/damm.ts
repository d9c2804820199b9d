/**
 * The totally anti-symmetric quasigroup of order 10 from H. M. Damm, 2004: the row is what the
 * digits so far came to, the column is the next digit. Zeros on the diagonal end a right number at 0.
 */
const QUASIGROUP = [
  "0317598642",
  "7092154863",
  "4206871359",
  "1750983426",
  "6123045978",
  "3674209581",
  "5869720134",
  "8945362017",
  "9438617205",
  "2581436790",
];

/**
 * The Damm check digit of a string of digits. Appended, it makes every single wrong digit and every
 * swap of two neighbours show. Leading zeros do not change it, so they go unseen when lost.
 *
 * Source: H. M. Damm, Total anti-symmetrische Quasigruppen, Marburg 2004.
 */
export function checkDigit(digits: string): string {
  return [...digits].reduce((sofar, digit) => QUASIGROUP[Number(sofar)]![Number(digit)]!, "0");
}

/** Says whether the last digit is the Damm check digit of those before it; false for no digits. */
export function isChecked(digits: string): boolean {
  return /^\d+$/.test(digits) && checkDigit(digits) === "0";
}
