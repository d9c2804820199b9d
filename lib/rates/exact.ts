import { assert } from "@/lib/assert";

/** An exact fraction; the denominator is positive. Money is never a binary float. */
export interface Exact {
  numerator: bigint;
  denominator: bigint;
}

const DECIMAL = /^(-?)(\d+)(?:\.(\d+))?$/;

/** A whole number, or a fraction of two, in lowest terms. */
export function exact(numerator: number | bigint, denominator: number | bigint = 1): Exact {
  assert(denominator > 0, "exact: the denominator is positive");
  const [above, below] = [BigInt(numerator), BigInt(denominator)];
  const divisor = commonDivisor(above < 0n ? -above : above, below);
  return { numerator: above / divisor, denominator: below / divisor };
}

/**
 * Reads a decimal text, such as "14.25", without loss.
 *
 * @throws RangeError on any other text
 */
export function exactOf(decimal: string): Exact {
  const match = DECIMAL.exec(decimal);
  assert(match !== null, `exactOf: ${decimal} is no decimal`);
  const [, sign = "", whole = "", fraction = ""] = match;
  return exact(BigInt(`${sign}${whole}${fraction}`), 10n ** BigInt(fraction.length));
}

/** Adds fractions; of none it is 0. */
export function added(...parts: readonly Exact[]): Exact {
  return parts.reduce(
    (total, part) =>
      exact(
        total.numerator * part.denominator + part.numerator * total.denominator,
        total.denominator * part.denominator,
      ),
    exact(0),
  );
}

/** Multiplies fractions. */
export function times(...parts: readonly Exact[]): Exact {
  return parts.reduce((product, part) =>
    exact(product.numerator * part.numerator, product.denominator * part.denominator),
  );
}

/**
 * Divides by a positive fraction.
 *
 * @throws RangeError where the divisor is 0 or less: ask first
 */
export function dividedBy(one: Exact, other: Exact): Exact {
  assert(other.numerator > 0n, "dividedBy: the divisor is positive");
  return exact(one.numerator * other.denominator, one.denominator * other.numerator);
}

/** The larger of two fractions. */
export function larger(one: Exact, other: Exact): Exact {
  return one.numerator * other.denominator >= other.numerator * one.denominator ? one : other;
}

/** The fraction, or 0 where it is below. */
export function notBelowZero(one: Exact): Exact {
  return larger(one, exact(0));
}

/**
 * Writes a fraction of 0 or more with so many decimal places, rounded once, half up.
 *
 * @throws RangeError below 0
 */
export function decimalText({ numerator, denominator }: Exact, places: number): string {
  assert(numerator >= 0n, "decimalText: 0 or more");
  const scale = 10n ** BigInt(places);
  const rounded = (2n * numerator * scale + denominator) / (2n * denominator);
  const digits = String(rounded).padStart(places + 1, "0");
  return places === 0 ? digits : `${digits.slice(0, -places)}.${digits.slice(-places)}`;
}

/** Euclid's algorithm; keeps long sums of fractions from growing without end. */
function commonDivisor(one: bigint, other: bigint): bigint {
  let [large, small] = [one, other];
  while (small > 0n) [large, small] = [small, large % small];
  return large;
}
