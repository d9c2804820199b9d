/** Sums numbers; an empty list is 0. */
export function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}
