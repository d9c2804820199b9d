"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import type { Room } from "@/lib/access/rooms";

/** The rooms of one leaf, the one that is open underlined. */
export function OfficeNav({ label, rooms }: { label: string; rooms: readonly Room[] }) {
  const path = usePathname();
  return (
    <nav aria-label={label} className="desk-nav">
      {rooms.map((room) => (
        <Link
          key={room.path}
          href={room.path}
          aria-current={isInRoom(path, room) ? "page" : undefined}
        >
          {room.name}
        </Link>
      ))}
    </nav>
  );
}

const isInRoom = (path: string, { path: own, also }: Room) =>
  isIn(path, own) || (also !== undefined && isIn(path, also));

const isIn = (path: string, room: string) => path === room || path.startsWith(`${room}/`);
