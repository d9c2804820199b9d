import type { ReactNode } from "react";
import { Mark } from "@/components/shell/mark";
import { PageGrain } from "@/components/ui/page-grain";
import { Purfling } from "@/components/ui/purfling";

/**
 * A whole page that says one thing: what is, on the book, and what to do, on the day. For a page
 * that is not there, a door that is closed, or a fault of ours.
 */
export function SeamNotice({ title, children }: { title: string; children: ReactNode }) {
  return (
    <main className="leaves relative grid min-h-dvh grid-cols-2 items-center overflow-hidden">
      <PageGrain />
      <Purfling />
      <Mark className="on-seam top-4 h-28" />
      <h1 className="z-3 px-8 text-right text-t-6 text-balance sm:text-t-7">{title}</h1>
      <div className="z-3 grid justify-items-start gap-4 px-8 text-t-4">{children}</div>
    </main>
  );
}
