import type { GaugeState } from "@/components/seam/gauge-kinds";
import { Icon } from "@/components/ui/icon";
import type { SeamParts } from "@/lib/seam/parts";

const percent = (share: number) => `${share * 100}%`;
const flag = (on: boolean) => (on ? "" : undefined);

/** The boards of a gauge, from the book's rim to the day's. */
export function GaugeDrawing({
  parts: { book, day, over, hand, folded },
  blank,
  state,
}: {
  parts: SeamParts;
  blank: boolean;
  state: GaugeState;
}) {
  const end = percent(0.5 + day / 2);
  return (
    <>
      {blank && state !== "other-work" && <b className="seam-blank" />}
      {book > 0 && (
        <b
          className="seam-book"
          data-folded={flag(folded.book)}
          style={{ width: percent(book / 2) }}
        />
      )}
      <b
        className="seam-day"
        data-rim={flag(over === 0 && !folded.day)}
        data-folded={flag(over === 0 && folded.day)}
        style={{ width: percent(day / 2) }}
      />
      {hand > 0 && <b className="seam-hand" style={{ left: end, width: percent(hand / 2) }} />}
      {over > 0 && (
        <b
          className="seam-over"
          data-folded={flag(folded.day)}
          style={{ left: end, width: `calc(${percent(over / 2)} - var(--kerf))` }}
        />
      )}
      {state === "held" && (
        <b className="seam-clamp" style={{ left: end }}>
          <Icon name="clamp" />
        </b>
      )}
    </>
  );
}

/** The gauge on a printed ticket: the standard, and an empty rule to shade up to its mark. */
export function PaperDrawing({ parts: { book } }: { parts: SeamParts }) {
  return (
    <>
      <b className="seam-book" style={{ width: percent(book / 2) }} />
      <b className="seam-rule" />
      <b className="seam-kerf" style={{ left: percent(0.5 + book / 2) }} />
    </>
  );
}
