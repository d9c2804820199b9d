import type { ReactNode } from "react";

/** What a sign asks: beware (yellow triangle), must (blue disc), must not (red ring). */
export type SignShape = "beware" | "must" | "must-not";

const BLUE = "var(--mandatory)";
const hand =
  "M45 84V70c0-4 2-6 2-12V40c0-5-6-5-6 0v11-24c0-5-6-5-6 0v22-25c0-5-6-5-6 0v25-18c0-5-6-5-6 0v28c0 6 4 8 4 12v13z";
const otherHand =
  "M55 84V70c0-4-2-6-2-12V40c0-5 6-5 6 0v11-24c0-5 6-5 6 0v22-25c0-5 6-5 6 0v25-18c0-5 6-5 6 0v28c0 6-4 8-4 12v13z";
const head = "M50 16c17 0 27 12 27 30 0 22-12 39-27 39S23 68 23 46c0-18 10-30 27-30z";

/**
 * The pictures of our safety signs, drawn after the manner of ISO 7010 and to be checked by the
 * site's safety officer. Triangles are 100 by 90, discs 100 by 100.
 */
export const signPictures = {
  "w-general": beware(
    <>
      <path d="M43 30h14l-3.5 30h-7z" />
      <circle cx="50" cy="70" r="5.5" />
    </>,
  ),
  "w-flame": beware(
    <path d="M38 76c-9-11 2-18 4-27 3 3 4 7 4 10 7-4 9-13 6-22 11 7 19 24 11 39-1-6-3-8-7-10 0 6-4 7-5 10z" />,
  ),
  "w-ex": beware(
    <path d="M32 50h15v5H38v7h8v5h-8v7h9v5H32zM50 50h6.6l4.4 8.5 4.4-8.5H72L64.8 64.5 73 79h-6.7L61 69.5 55.7 79H49l8.2-14.5z" />,
  ),
  "w-hot": beware(
    <path
      fill="none"
      stroke="currentColor"
      strokeWidth="5"
      d="M26 76h48M37 68c-6-7 5-10 0-17s3-9 0-13M50 68c-6-7 5-10 0-17s3-9 0-17M63 68c-6-7 5-10 0-17s3-9 0-13"
    />,
  ),
  "w-crush": beware(
    <>
      <path d="M24 73h52v6H24zM33 51h37v5H33zM46 26h8v11h6L50 48 40 37h6z" />
      <path d="M24 60l11-1 7 3h27a2.6 2.6 0 0 1 0 5.2H48l18 .3a2.3 2.3 0 0 1 0 4.5H24z" />
    </>,
  ),
  "w-rollers": beware(
    <>
      <g fill="none" stroke="currentColor" strokeWidth="4.5">
        <circle cx="36" cy="67" r="11" />
        <circle cx="64" cy="67" r="11" />
      </g>
      <circle cx="36" cy="67" r="3" />
      <circle cx="64" cy="67" r="3" />
      <path d="M43 38c0-4 4-4 4 0v-5c0-4 5-4 5 0v5c0-4 4-4 4 0v9c0 5-3 6-3 11l-2 13h-2l-2-13c0-5-4-6-4-11z" />
    </>,
  ),
  "w-electric": beware(<path d="M55 24L37 56h11l-8 24 23-31H51z" />),

  "m-mask": must(
    <>
      <path d="M50 16c16 0 24 11 24 26v9H26v-9c0-15 8-26 24-26z" fill="#fff" />
      <path
        d="M33 52h34l4 12c0 12-10 20-21 20s-21-8-21-20z"
        fill={BLUE}
        stroke="#fff"
        strokeWidth="4"
      />
      <g fill="#fff" stroke={BLUE} strokeWidth="3">
        <circle cx="33" cy="71" r="8.5" />
        <circle cx="67" cy="71" r="8.5" />
      </g>
      <path d="M45 62h10M45 68h10" stroke="#fff" strokeWidth="3" />
      <path d="M36 40h9M55 40h9" stroke={BLUE} strokeWidth="5" />
    </>,
  ),
  "m-dust": must(
    <>
      <path d={head} fill="#fff" />
      <path d="M34 40h10M56 40h10" stroke={BLUE} strokeWidth="5" />
      <path
        d="M21 50l16 3c8-6 18-6 26 0l16-3v4l-13 6c0 12-6 18-16 18s-16-6-16-18l-13-6z"
        fill={BLUE}
      />
      <path d="M41 62h18M41 68h18" stroke="#fff" strokeWidth="2.5" />
    </>,
  ),
  "m-eyes": must(
    <>
      <path d="M50 14c20 0 29 14 29 32 0 22-13 40-29 40S21 68 21 46c0-18 9-32 29-32z" fill="#fff" />
      <path
        d="M19 38h62v9c0 8-6 13-14 13-9 0-12-5-14-10h-6c-2 5-5 10-14 10-8 0-14-5-14-13z"
        fill={BLUE}
      />
      <path d="M27 44h16M57 44h16" stroke="#fff" strokeWidth="3.5" />
      <path d="M42 73h16" stroke={BLUE} strokeWidth="4" />
    </>,
  ),
  "m-ears": must(
    <>
      <path d={head} fill="#fff" />
      <path d="M22 48C20 24 34 11 50 11s30 13 28 37" fill="none" stroke="#fff" strokeWidth="5" />
      <g fill="#fff" stroke={BLUE} strokeWidth="3">
        <rect x="14" y="38" width="16" height="28" rx="7" />
        <rect x="70" y="38" width="16" height="28" rx="7" />
      </g>
      <path d="M36 45h9M55 45h9M42 71h16" stroke={BLUE} strokeWidth="4.5" />
    </>,
  ),
  "m-gloves": must(
    <>
      <path d={hand + otherHand} fill="#fff" />
      <path d="M26 76h20M54 76h20" stroke={BLUE} strokeWidth="3" />
    </>,
  ),

  "p-gloves": mustNot(
    <>
      <path transform="translate(15 0)" d={hand} />
      <path d="M41 76h20" stroke="#fff" strokeWidth="3" />
    </>,
  ),
} as const;

/** The signs that exist; one that is not drawn does not compile. */
export type SignName = keyof typeof signPictures;

function beware(picture: ReactNode) {
  return { shape: "beware" as SignShape, picture };
}

function must(picture: ReactNode) {
  return { shape: "must" as SignShape, picture };
}

function mustNot(picture: ReactNode) {
  return { shape: "must-not" as SignShape, picture };
}
