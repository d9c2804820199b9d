import Link from "next/link";
import { standardsAddress } from "@/components/standards/address";
import { Icon } from "@/components/ui/icon";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import type { StandardsView } from "@/lib/replay/page";
import type { StandardLine } from "@/lib/standards/lines";
import { minutesText } from "@/lib/standards/minutes";
import { dateText } from "@/lib/time/format";

/** The model's operations in route order with the standard of the day; each opens on the day leaf. */
export function StandardsTable({ view }: { view: StandardsView }) {
  const { query, model, open } = view;
  const { stage, on } = query;
  return (
    <section className={open ? "standards-beside" : undefined}>
      <Ledger caption={`Standards of ${model}`} tight className="standards-table">
        <thead>
          <tr>
            <Head>Op</Head>
            <Head>Operation</Head>
            <NumberHead>Setup min</NumberHead>
            <NumberHead>Run min</NumberHead>
            <Head>Since, by</Head>
          </tr>
        </thead>
        <tbody>
          {view.lines.map((line) => (
            <StandardRow
              key={line.operation}
              line={line}
              isOpen={line.operation === open?.operation}
              href={standardsAddress({ model, stage, on, op: line.operation })}
            />
          ))}
        </tbody>
      </Ledger>
    </section>
  );
}

function StandardRow({
  line,
  isOpen,
  href,
}: {
  line: StandardLine;
  isOpen: boolean;
  href: string;
}) {
  const { operation, name, stage, inForce, options, changesOn } = line;
  return (
    <tr data-chosen={isOpen ? "" : undefined}>
      <td className="code text-ink-2">{operation}</td>
      <td>
        <Link href={href} scroll={false} aria-current={isOpen || undefined} className="font-[650]">
          {name}
          {isOpen && <Icon name="go" className="ml-2 size-4" />}
        </Link>{" "}
        <span className="text-t-2 text-ink-2">
          {stage}
          {options.length > 0 && `, more with ${options.join(", ")}`}
        </span>
      </td>
      <NumberCell data-standard="">{inForce ? minutesText(inForce.setupSeconds) : ""}</NumberCell>
      <NumberCell data-standard="">
        {inForce ? (
          minutesText(inForce.runSeconds)
        ) : (
          <span className="font-medium text-ink-2">none</span>
        )}
      </NumberCell>
      <td className="text-t-2 text-ink-2">
        {inForce ? `${dateText(inForce.effectiveFrom)}, ${inForce.enteredBy}` : "no standard"}
        {changesOn && <span className="block text-ink">changes {dateText(changesOn)}</span>}
      </td>
    </tr>
  );
}
