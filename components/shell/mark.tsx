import { useId } from "react";

const BOOK =
  "M-2 0H-12C-28 0-38 11-38 27C-38 41-27 47-27 57C-27 67-46 72-46 92C-46 111-32 120-12 120H-2Z";
const DAY = "M2 0H12C28 0 38 11 38 27C38 41 27 47 27 57C27 67 46 72 46 92C46 111 32 120 12 120H2Z";
const DAY_BOWLS =
  "M11 12V47H13C19 47 27 39 27 27C27 18 21 12 12 12ZM11 66V108H13C26 108 35 102 35 92C35 80 24 74 20 66Z";
const BOOK_SMALL =
  "M-5 3.5H-12C-26 3.5-34.5 13-34.5 27C-34.5 39-23.5 45-23.5 57C-23.5 69-42.5 74-42.5 92C-42.5 109-30 116.5-12 116.5H-5Z";
const GRAIN = [-7.5, -10.5, -14, -18, -22.5, -28, -34.5, -41].map((x) => `M${x} 0V120`).join("");

/**
 * The mark: a bookmatched B, whose bowls are bout and waist. The left half is ruled with grain,
 * tight at the seam and wide at the rim, the right half is solid. It stands on the seam.
 * Under 60 px of height use `SmallMark`.
 */
export function Mark({ className = "" }: { className?: string }) {
  const clip = useId();
  return (
    <svg viewBox="-50 -4 100 128" className={className} role="img" aria-label="Bookmatch">
      <clipPath id={clip}>
        <path d={BOOK} />
      </clipPath>
      <path fill="currentColor" fillRule="evenodd" d={DAY + DAY_BOWLS} />
      <g clipPath={`url(#${clip})`} stroke="currentColor">
        <path fill="var(--standard-fill)" strokeWidth="6" d={BOOK} />
        <path strokeWidth="1.5" d={GRAIN} />
      </g>
    </svg>
  );
}

/** The mark without its grain and bowls, for less than 60 px of height. */
export function SmallMark({ className = "" }: { className?: string }) {
  return (
    <svg viewBox="-50 -4 100 128" className={className} role="img" aria-label="Bookmatch">
      <path fill="currentColor" d={DAY} />
      <path fill="var(--standard-fill)" stroke="currentColor" strokeWidth="7" d={BOOK_SMALL} />
    </svg>
  );
}
