/** PostgreSQL takes at most 65,535 parameters a statement; so many rows of the widest table fit. */
const ROWS_MAX = 2_000;

/** Writes many rows with few statements, in their order. */
export async function inChunks<T>(
  rows: readonly T[],
  write: (chunk: T[]) => PromiseLike<unknown>,
): Promise<void> {
  for (let at = 0; at < rows.length; at += ROWS_MAX) await write(rows.slice(at, at + ROWS_MAX));
}
