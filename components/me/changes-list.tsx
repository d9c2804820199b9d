import type { ChangeLine } from "@/lib/me/changes";

/** What others entered in one's time in the last weeks: what, who, and why. */
export function ChangesList({ changes }: { changes: readonly ChangeLine[] }) {
  if (changes.length === 0) return null;
  return (
    <section aria-label="Changes by others" className="me-changes">
      <h2>Changed by others</h2>
      <ul>
        {changes.map(({ id, what, who, why }) => (
          <li key={id}>
            <b>{what}</b>
            <span>
              {who}
              {why && `: “${why}”`}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
