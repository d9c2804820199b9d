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
          aria-current={isIn(path, room.path) ? "page" : undefined}
        >
          {room.name}
        </Link>
      ))}
    </nav>
  );
}

const isIn = (path: string, room: string) => path === room || path.startsWith(`${room}/`);
