import type { ReactNode } from "react";
import { PageGrain } from "@/components/ui/page-grain";

/**
 * A page or a list with nothing in it: page grain, one sentence on the book, at most one act on the
 * day. `No one is on a ticket. The hall opens at 06:00.`
 */
export function Empty({ children, act }: { children: ReactNode; act?: ReactNode }) {
  return (
    <section className="@container relative py-16">
      <PageGrain />
      <div className="relative grid items-center gap-6 px-6 @xl:grid-cols-2 @xl:gap-0 @xl:px-0">
        <p className="text-t-5 leading-tight font-semibold text-balance @xl:px-8 @xl:text-right">
          {children}
        </p>
        <div className="@xl:px-8">{act}</div>
      </div>
    </section>
  );
}
