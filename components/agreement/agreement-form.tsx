"use client";

import { CardRow } from "@/components/agreement/card-row";
import { SeamAxis } from "@/components/seam/axis";
import { Columns } from "@/components/shell/columns";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { Button } from "@/components/ui/button";
import { GroupRow, Head, Ledger, NumberHead } from "@/components/ui/table";
import type { CardLine } from "@/lib/agreement/page";
import { seamScale } from "@/lib/seam/scale";

const WIDTHS = {
  tick: 4,
  number: 5,
  worker: 15,
  cell: 8,
  planned: 6,
  gauge: 24,
  present: 7,
  look: 19,
  self: 6,
  lead: 6,
};

/** Cards on one scale; those without an open question are ticked, and agreed to at once. */
export function AgreementForm({
  action,
  formId,
  toLookAt,
  agreed,
  range,
}: {
  action: FormAction<void>;
  formId: string;
  toLookAt: readonly CardLine[];
  agreed: readonly CardLine[];
  range: { from: string; to: string };
}) {
  const sent = useAnswer(action);
  const scaleSeconds = seamScale(
    [...toLookAt, ...agreed].map(({ plannedSeconds, presentSeconds }) => ({
      standardSeconds: plannedSeconds,
      actualSeconds: presentSeconds,
    })),
  );
  const ready = toLookAt.filter(({ toAgree }) => toAgree.length > 0);
  const row = { range, scaleSeconds };
  return (
    <form action={sent.send} key={formId}>
      <input type="hidden" name="id" value={formId} />
      <Ledger caption="Cards, those to look at first" className="mirror-ledger">
        <Columns widths={WIDTHS} />
        <thead>
          <tr>
            <th scope="col">
              <span className="sr-only">Agree</span>
            </th>
            <Head>No</Head>
            <Head>Worker</Head>
            <Head>Home cell</Head>
            <NumberHead>Planned</NumberHead>
            <th scope="col">
              <span className="sr-only">Planned and present</span>
              <SeamAxis scaleSeconds={scaleSeconds} unitShown />
            </th>
            <NumberHead>Present</NumberHead>
            <Head>To look at</Head>
            <Head>Self</Head>
            <Head>Lead</Head>
          </tr>
        </thead>
        <tbody>
          <GroupRow columns={10}>To look at, {toLookAt.length}</GroupRow>
          {toLookAt.map((line) => (
            <CardRow key={line.number} line={line} {...row} />
          ))}
        </tbody>
        <tbody>
          <GroupRow columns={10}>Agreed, {agreed.length}</GroupRow>
          {agreed.map((line) => (
            <CardRow key={line.number} line={line} {...row} />
          ))}
        </tbody>
      </Ledger>
      <div className="agreement-foot">
        <p role="status" className="font-[650] text-danger">
          {sent.problem?.errors ? "Tick at least one card." : sent.problem?.detail}
        </p>
        {ready.length > 0 && (
          <Button type="submit" tone="solid" rim="right" disabled={sent.isSending}>
            Agree to the ticked cards
          </Button>
        )}
      </div>
    </form>
  );
}
