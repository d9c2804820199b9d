"use client";

import type { ReactNode } from "react";
import { useTranslations } from "use-intl";
import { Board, Plate } from "@/components/ui/plate";

/** So many have the screen to themselves, and are larger. */
const FEW = 4;

/**
 * A list that never scrolls: plates in two leaves, and one that turns the page where there are
 * more. `size` is how many fit one page.
 */
export function Pages({
  plates,
  size,
  page,
  onPage,
}: {
  plates: readonly ReactNode[];
  size: number;
  page: number;
  onPage: (page: number) => void;
}) {
  const t = useTranslations("common");
  const pages = Math.max(1, Math.ceil(plates.length / size));
  const shown = plates.slice((page % pages) * size, (page % pages) * size + size);
  const half = Math.ceil(shown.length / 2);
  return (
    <div className="pages" data-few={plates.length <= FEW ? "" : undefined}>
      <Board stacked className="pages-leaf" data-side="book">
        {shown.slice(0, half)}
      </Board>
      <div className="grid content-start">
        <Board stacked className="pages-leaf" data-side="day">
          {shown.slice(half)}
          {pages > 1 && (
            <Plate icon="down" iconLast onClick={() => onPage(page + 1)}>
              {t("more")} ({(page % pages) + 1}/{pages})
            </Plate>
          )}
        </Board>
      </div>
    </div>
  );
}
