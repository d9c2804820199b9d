import type { ReactNode } from "react";
import { Mark } from "@/components/shell/mark";
import { Wordmark } from "@/components/shell/wordmark";
import { PageGrain } from "@/components/ui/page-grain";
import { Purfling } from "@/components/ui/purfling";
import "@/app/styles/desk.css";

/** The two leaves before anyone is known: the mark on the seam, the way in on the day's leaf. */
export function SignInLeaves({ book, children }: { book: ReactNode; children: ReactNode }) {
  return (
    <div className="leaves desk-door">
      <PageGrain />
      <Purfling />
      <header className="desk-door-head">
        <Mark className="on-seam h-[124px]" />
        <Wordmark className="h-9" />
      </header>
      {book && <aside className="desk-door-book">{book}</aside>}
      <main className="desk-door-day">{children}</main>
    </div>
  );
}
