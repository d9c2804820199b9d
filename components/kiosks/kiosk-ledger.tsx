import Link from "next/link";
import { Columns } from "@/components/shell/columns";
import { Icon } from "@/components/ui/icon";
import { Head, Ledger, NumberCell, NumberHead } from "@/components/ui/table";
import { clockText, dayText, hoursAndMinutes } from "@/lib/time/format";
import { localDate } from "@/lib/time/site-day";

const WIDTHS = { name: 20, cell: 18, enrolled: 12, seen: 16, records: 13, build: 12, battery: 9 };

/** Seen within this time a tablet is connected: it asks for the time every minute. */
const CONNECTED_MS = 3 * 60_000;

/** A kiosk of the list. */
export interface KioskRow {
  id: string;
  name: string;
  cells: readonly { id: string; name: string }[];
  enrolledAt: Date;
  lastSeenAt: Date | null;
  revokedAt: Date | null;
  build: string | null;
  queued: number | null;
  batteryPercent: number | null;
}

/** Where each tablet stands on the left, how it is on the right; those out of use last. */
export function KioskLedger({
  kiosks,
  nowMs,
  timeZone,
}: {
  kiosks: readonly KioskRow[];
  nowMs: number;
  timeZone: string;
}) {
  return (
    <Ledger caption="Kiosks" className="mirror-ledger">
      <Columns widths={WIDTHS} />
      <thead>
        <tr>
          <Head>Tablet</Head>
          <Head>Cell</Head>
          <Head>Enrolled</Head>
          <Head className="desk-after-seam">Last seen</Head>
          <Head>Records there</Head>
          <Head>Build</Head>
          <NumberHead>Battery</NumberHead>
        </tr>
      </thead>
      <tbody>
        {kiosks.map((kiosk) => (
          <tr key={kiosk.id}>
            <td data-book="">
              <Link href={`/kiosks/${kiosk.id}`} className="font-[650]">
                {kiosk.name}
              </Link>
            </td>
            <td data-book="">{kiosk.cells.map(({ name }) => name).join(", ")}</td>
            <td data-book="" className="text-ink-2">
              {dayText(localDate(kiosk.enrolledAt.getTime(), timeZone), "en-GB").slice(4)}
            </td>
            <td data-day="" className="desk-after-seam">
              <Seen kiosk={kiosk} nowMs={nowMs} timeZone={timeZone} />
            </td>
            <td data-day="">{keptWords(kiosk)}</td>
            <td data-day="" className="desk-cut text-ink-2">
              {kiosk.build && <code>{kiosk.build}</code>}
            </td>
            <NumberCell data-day="" data-label="battery">
              {kiosk.batteryPercent !== null && `${kiosk.batteryPercent} %`}
            </NumberCell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  );
}

function Seen({
  kiosk: { revokedAt, lastSeenAt },
  nowMs,
  timeZone,
}: {
  kiosk: KioskRow;
  nowMs: number;
  timeZone: string;
}) {
  if (revokedAt) return <span className="text-ink-2">out of use</span>;
  if (!lastSeenAt) return <span className="text-ink-2">not yet</span>;
  const agoMs = Math.max(0, nowMs - lastSeenAt.getTime());
  const isConnected = agoMs < CONNECTED_MS;
  const day = localDate(lastSeenAt.getTime(), timeZone);
  const isToday = day === localDate(nowMs, timeZone);
  const at = clockText(lastSeenAt.getTime(), timeZone);
  return (
    <span className="tag">
      <Icon name={isConnected ? "connected" : "saved-here"} />
      {isConnected
        ? "connected"
        : isToday
          ? `${at}, ${hoursAndMinutes(agoMs / 1000)} ago`
          : `${dayText(day, "en-GB").slice(4)}, ${at}`}
    </span>
  );
}

function keptWords({ queued, revokedAt }: KioskRow): string {
  if (revokedAt || queued === null) return "";
  return queued === 0 ? "none waiting" : `${queued} waiting`;
}
