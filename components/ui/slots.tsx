import { Fragment } from "react";

/**
 * Keyed digits in their slots, the next slot outlined. `length` slots stand ready; without one
 * there is always just one more. Nothing keyed is ever taken away: `doubtAt` outlines the digit in
 * question, and past digits of a longer number stay.
 */
export function Slots({
  digits,
  label,
  length,
  hyphensAfter = [],
  doubtAt,
  hidden = false,
  mono = false,
  className = "",
}: {
  digits: string;
  /** what is heard: what the number is, and what of it is keyed */
  label: string;
  length?: number;
  /** slots that a hyphen follows, counted from 1 */
  hyphensAfter?: readonly number[];
  /** the slot in doubt, counted from 0 */
  doubtAt?: number;
  /** a PIN: dots instead of digits */
  hidden?: boolean;
  /** a ticket's or a worker's number */
  mono?: boolean;
  className?: string;
}) {
  const count = Math.max(length ?? digits.length + 1, digits.length);
  return (
    <div
      role="img"
      aria-label={label}
      className={`slots ${className}`}
      data-mono={mono ? "" : undefined}
    >
      {Array.from({ length: count }, (_, at) => {
        const digit = digits[at];
        const key = `slot-${at}`;
        return (
          <Fragment key={key}>
            <span
              data-next={at === digits.length ? "" : undefined}
              data-doubt={at === doubtAt ? "" : undefined}
            >
              {digit && hidden ? "•" : digit}
            </span>
            {hyphensAfter.includes(at + 1) && <i />}
          </Fragment>
        );
      })}
    </div>
  );
}
