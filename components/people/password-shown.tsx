import type { GivenPassword } from "@/lib/access/schema";

/** A password that the system made, shown once: nobody can look it up again. */
export function PasswordShown({ given }: { given: GivenPassword }) {
  return (
    <div role="status" className="desk-once">
      <p>
        Password of {given.name}, {given.email}
      </p>
      <p className="desk-secret text-t-5">
        <code>{given.password}</code>
      </p>
      <p className="text-ink-2">
        It is shown this once. Hand it over; the person can change it under “Your password”.
      </p>
    </div>
  );
}
