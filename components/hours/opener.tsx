import Link from "next/link";
import { Icon } from "@/components/ui/icon";
import type { HoursFilter } from "@/lib/hours/filter";

/** Opens a line under itself, or closes it; what is open stands in the address. */
export function Opener({
  filter,
  isOpen,
  label,
}: {
  /** The filter that the link leads to. */
  filter: HoursFilter;
  isOpen: boolean;
  label: string;
}) {
  const pairs = Object.entries(filter).filter(([, value]) => value !== "");
  return (
    <Link
      href={`/hours?${new URLSearchParams(pairs)}`}
      scroll={false}
      className="desk-opener"
      aria-expanded={isOpen}
      aria-label={label}
    >
      <Icon name={isOpen ? "up" : "down"} />
    </Link>
  );
}
