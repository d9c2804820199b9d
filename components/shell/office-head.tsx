import type { ReactNode } from "react";
import { OfficeNav } from "@/components/shell/office-nav";
import { Wordmark } from "@/components/shell/wordmark";
import type { Room } from "@/lib/access/rooms";

/**
 * The head of the office: rooms of the book on the left, rooms of the day on the right, and the seam
 * drops from the wordmark between them. On a phone the leaves fold under the wordmark.
 */
export function OfficeHead({
  site,
  rooms,
  menu,
}: {
  site: string;
  rooms: readonly Room[];
  menu: ReactNode;
}) {
  return (
    <header className="desk-head">
      <div className="desk-leaf">
        <p className="desk-site">{site}</p>
        <OfficeNav label="Known beforehand" rooms={rooms.filter(({ leaf }) => leaf === "book")} />
      </div>
      <a href="/" className="desk-word">
        <Wordmark className="h-[23px]" />
      </a>
      <div className="desk-leaf">
        <OfficeNav label="Happening" rooms={rooms.filter(({ leaf }) => leaf === "day")} />
        {menu}
      </div>
    </header>
  );
}
