import Link from "next/link";
import { Columns } from "@/components/shell/columns";
import { Head, Ledger, NumberHead } from "@/components/ui/table";
import { dayText } from "@/lib/time/format";

const WIDTHS = { number: 9, name: 25, cell: 16, language: 12, pin: 12, account: 26 };

/** A worker as People lists one. */
export interface PersonRow {
  number: string;
  name: string;
  cell: string;
  language: string;
  pinSetAt: Date | null;
  endsOn: string | null;
  email: string | null;
}

const languages: Record<string, string> = { en: "English", es: "Español" };

/** Who works here: who they are on the left, what the kiosk and the office know of them right. */
export function PeopleTable({ workers, today }: { workers: readonly PersonRow[]; today: string }) {
  return (
    <Ledger caption="People" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <NumberHead>No</NumberHead>
          <Head>Worker</Head>
          <Head>Home cell</Head>
          <Head className="desk-after-seam">Language</Head>
          <Head>PIN</Head>
          <Head>Office account</Head>
        </tr>
      </thead>
      <tbody>
        {workers.map((worker) => (
          <tr key={worker.number}>
            <td data-book="" data-number="" className="code text-ink-2">
              {worker.number}
            </td>
            <td data-book="" className="desk-cut">
              <Link href={`/people/${worker.number}`} className="font-[650]">
                <bdi>{worker.name}</bdi>
              </Link>
            </td>
            <td data-book="">{worker.cell}</td>
            <td data-day="" className="desk-after-seam">
              {languages[worker.language] ?? worker.language}
            </td>
            <td data-day="">{leavingOf(worker, today) ?? pinOf(worker)}</td>
            <td data-day="" className="desk-wrap text-ink-2">
              {worker.email}
            </td>
          </tr>
        ))}
      </tbody>
    </Ledger>
  );
}

function leavingOf({ endsOn }: PersonRow, today: string): string | null {
  if (!endsOn) return null;
  return `${endsOn < today ? "left" : "until"} ${dayText(endsOn, "en-GB").slice(4)}`;
}

const pinOf = ({ pinSetAt }: PersonRow) => (pinSetAt ? "given" : "none yet");
