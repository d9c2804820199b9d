import Link from "next/link";
import type { GivenPin } from "@/lib/people/schema";

/** A new PIN, shown once: nobody can look it up again. */
export function PinShown({ given }: { given: GivenPin }) {
  return (
    <div role="status" className="desk-once">
      <p>
        PIN of {given.name}, number <code>{given.number}</code>
      </p>
      <p className="desk-secret">
        <code>
          {given.pin.slice(0, 3)} {given.pin.slice(3)}
        </code>
      </p>
      <p className="text-ink-2">It is shown this once. Hand it over, do not send it.</p>
      <p>
        <Link href={`/people/${given.number}/badge`} className="button" data-rim="right">
          Print the badge
        </Link>
      </p>
    </div>
  );
}
