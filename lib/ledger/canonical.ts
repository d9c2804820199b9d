/** Deeper than any event is; what lies below is cut, so that no text is too deep to keep. */
const DEPTH_MAX = 64;

/**
 * Writes a JSON value as one text: keys sorted, no spaces, so that the same record has the same
 * text, and the same hash, however it was spelled. Never fails: below 64 levels it writes `null`.
 */
export function canonicalJson(value: unknown, depth = 0): string {
  if (typeof value !== "object" || value === null) return JSON.stringify(value) ?? "null";
  if (depth >= DEPTH_MAX) return "null";
  if (Array.isArray(value)) {
    return `[${value.map((entry) => canonicalJson(entry, depth + 1)).join(",")}]`;
  }
  const entries = Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1));
  const fields = entries.map(
    ([key, entry]) => `${JSON.stringify(key)}:${canonicalJson(entry, depth + 1)}`,
  );
  return `{${fields.join(",")}}`;
}
