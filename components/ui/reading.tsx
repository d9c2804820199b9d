/** Shares of a leaf that the outlines of a page being read take: enough to be seen as rows. */
const OUTLINES = [0.7, 0.45, 0.6, 0.3];

/**
 * A list that is being read: both leaves as dashed outlines, at the lengths they had last if these
 * are known (shares of a leaf, 0 to 1). There is no spinner; after 4 s it says so in words.
 */
export function Reading({ outlines = OUTLINES }: { outlines?: readonly number[] }) {
  return (
    <div role="status" className="reading">
      {outlines.map((share, row) => {
        const key = `outline-${row}`;
        return <i key={key} style={{ width: `${share * 100}%` }} />;
      })}
      <span>still reading</span>
    </div>
  );
}
