/** The columns of a mirrored ledger by name; those left of the gauge and half of it make 50 %. */
export function Columns({ widths }: { widths: Record<string, number> }) {
  return (
    <colgroup>
      {Object.entries(widths).map(([name, percent]) => (
        <col key={name} style={{ width: `${percent}%` }} />
      ))}
    </colgroup>
  );
}
