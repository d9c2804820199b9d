import Link from "next/link";
import { Icon } from "@/components/ui/icon";

/** Opens a line under itself, or closes it; what is open stands in the address. */
export function LineOpener({
  href,
  isOpen,
  label,
}: {
  href: string;
  isOpen: boolean;
  label: string;
}) {
  return (
    <Link
      href={href}
      scroll={false}
      className="desk-opener"
      aria-expanded={isOpen}
      aria-label={label}
    >
      <Icon name={isOpen ? "up" : "down"} />
    </Link>
  );
}
