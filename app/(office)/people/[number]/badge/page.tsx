import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { personFor } from "@/app/_server/page-actor";
import { barsOf, dotsOf } from "@/app/_server/print";
import { siteOf } from "@/app/_server/site";
import { Badge } from "@/components/print/badge";
import { PrintButton } from "@/components/print/print-button";
import { findWorker } from "@/db/people/queries";
import { badgeCode } from "@/lib/codes/badge-code";

export const metadata: Metadata = { title: "Badge" };

interface BadgeProps {
  params: Promise<{ number: string }>;
}

/** A worker's badge, to print and cut out. */
export default async function BadgePage({ params }: BadgeProps) {
  const { scope, cells } = await personFor("people.see");
  const [worker, site] = await Promise.all([
    findWorker(scope, (await params).number, cells),
    siteOf(scope.siteId),
  ]);
  if (!worker) notFound();
  const code = badgeCode(worker.number);
  return (
    <div className="paper-desk">
      <PrintButton />
      <Badge worker={worker} site={site.name} bars={barsOf(code)} dots={dotsOf(code)} />
    </div>
  );
}
