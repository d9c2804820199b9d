import Link from "next/link";
import { Mark } from "@/components/shell/mark";

/** Whose page it is, the mark on the seam, and for people of the office the way back to it. */
export function MeHead({
  me,
  office,
}: {
  me: { number: string; name: string };
  office: string | null;
}) {
  return (
    <header className="me-head">
      <p className="me-book">
        <b>{me.name}</b> <span className="code">{me.number}</span>
      </p>
      <Mark className="on-seam me-mark" />
      <p className="me-day">{office && <Link href={office}>Office</Link>}</p>
    </header>
  );
}
