import { type StandardItem, standardItem } from "@/lib/standards/schema";

/** A standard as programs get it; who entered it stays in the office. */
export function standardItemOf(
  row: Omit<StandardItem, "enteredAt"> & { enteredAt: Date },
): StandardItem {
  return standardItem.parse({ ...row, enteredAt: row.enteredAt.toISOString() });
}
