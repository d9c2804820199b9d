"use client";

import { useState } from "react";
import useSWR from "swr";
import { fetchJson, type ProblemError } from "@/components/fetch-json";
import { FloorHead } from "@/components/floor/floor-head";
import { FloorLedger } from "@/components/floor/floor-ledger";
import { NobodyIn } from "@/components/floor/nobody-in";
import type { Forgotten } from "@/components/floor/person-name";
import { useServerClock } from "@/components/floor/use-server-clock";
import { StaleNote } from "@/components/ui/stale-note";
import { type FloorView, floorView } from "@/lib/floor/schema";
import { clockText } from "@/lib/time/format";

const REFRESH_MS = 10_000;
const TICK_MS = 5_000;

/**
 * Who is on what, refreshed every 10 s; between two answers the gauges grow by the clock. The page
 * hands over `initial`, so mounting fetches nothing. Where the server is away the last picture stays
 * and says as of when it is.
 */
export function FloorBoard({
  initial,
  nowMs,
  linksTickets,
  forgotten = null,
}: {
  initial: FloorView;
  /** When the server drew `initial`. */
  nowMs: number;
  linksTickets: boolean;
  /** For whom the one who looks may enter a forgotten start or end; null for nobody. */
  forgotten?: Forgotten | null;
}) {
  const clock = useServerClock(nowMs, TICK_MS);
  const [freshMs, setFreshMs] = useState(nowMs);
  const { data: floor = initial, error } = useSWR<FloorView, ProblemError>(
    "/api/floor",
    (url: string) => fetchJson(url, floorView),
    {
      fallbackData: initial,
      revalidateOnMount: false,
      refreshInterval: REFRESH_MS,
      onSuccess: () => setFreshMs(clock.readMs()),
    },
  );
  const shown = { floor, nowMs: error ? freshMs : clock.nowMs, linksTickets };
  return (
    <div data-stale={error ? "" : undefined}>
      <FloorHead {...shown} />
      {error && (
        <div className="desk-note">
          <StaleNote asOf={clockText(freshMs, floor.timeZone)}>{error.message}</StaleNote>
        </div>
      )}
      {floor.cells.length > 0 ? (
        <FloorLedger {...shown} forgotten={forgotten} />
      ) : (
        <NobodyIn {...shown} />
      )}
    </div>
  );
}
