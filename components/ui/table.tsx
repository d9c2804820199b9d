import type { ReactNode, TdHTMLAttributes, ThHTMLAttributes } from "react";

/** A ledger: rules, no boxes, no stripes. Its `caption` is heard, not seen. `tight` rows are 27 px. */
export function Ledger({
  caption,
  children,
  tight = false,
  className = "",
}: {
  caption: string;
  children: ReactNode;
  tight?: boolean;
  className?: string;
}) {
  return (
    <table className={`ledger ${className}`} data-tight={tight ? "" : undefined}>
      <caption className="sr-only">{caption}</caption>
      {children}
    </table>
  );
}

/** The head of a column of words. */
export function Head(props: ThHTMLAttributes<HTMLTableCellElement>) {
  return <th scope="col" {...props} />;
}

/** The head of a column of figures, with their unit. */
export function NumberHead(props: ThHTMLAttributes<HTMLTableCellElement>) {
  return <th scope="col" {...props} data-number="" />;
}

/** A figure: tabular, right-aligned. */
export function NumberCell(props: TdHTMLAttributes<HTMLTableCellElement>) {
  return <td {...props} data-number="" />;
}

/** The row above a group of rows: `To look at, 4`. Its `note` stands on the day's rim. */
export function GroupRow({
  columns,
  children,
  note,
}: {
  columns: number;
  children: ReactNode;
  note?: ReactNode;
}) {
  return (
    <tr data-group="">
      <th scope="rowgroup" colSpan={columns}>
        <span className="flex items-baseline justify-between">
          <span>{children}</span>
          {note && <span className="text-t-2 font-medium text-ink-2">{note}</span>}
        </span>
      </th>
    </tr>
  );
}
