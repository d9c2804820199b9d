"use client";

import { type ReactNode, useEffect, useRef } from "react";

/**
 * The one question of a screen, read across the seam. It takes the focus when the screen comes, so
 * that it is heard, and so that no key pressed twice falls on a button of the next screen.
 */
export function Ask({
  book,
  day,
  className = "text-k-4",
}: {
  book: ReactNode;
  day?: ReactNode;
  className?: string;
}) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus({ preventScroll: true }), []);
  return (
    <h1
      ref={heading}
      tabIndex={-1}
      className={`mirror items-center font-bold leading-[1.08] outline-none ${className}`}
    >
      <span className="min-w-0 pr-[26px] pl-6 [text-wrap:balance]">{book}</span>
      <span className="min-w-0 pr-6 pl-[26px] [text-wrap:balance]">{day}</span>
    </h1>
  );
}

/** Two leaves side by side: what is known on the book's, what is answered on the day's. */
export function Leaves({
  book,
  day,
  className = "",
}: {
  book: ReactNode;
  day: ReactNode;
  className?: string;
}) {
  return (
    <div className={`grid min-h-0 grid-cols-2 ${className}`}>
      <div className="min-w-0 pr-[26px] pl-8 portrait:pr-[18px] portrait:pl-6">{book}</div>
      <div className="min-w-0 pr-8 pl-[26px] portrait:pr-6 portrait:pl-[18px]">{day}</div>
    </div>
  );
}

/** The foot of a screen: ways back on the book's rim, ways forward on the day's. */
export function Foot({ book, day }: { book: ReactNode; day?: ReactNode }) {
  const row = "flex gap-3.5 [&>*]:min-w-0 [&>*]:flex-1 portrait:flex-col-reverse";
  return (
    <Leaves
      className="items-end pt-2.5 pb-3.5 portrait:pb-6"
      book={<div className={row}>{book}</div>}
      day={<div className={row}>{day}</div>}
    />
  );
}
