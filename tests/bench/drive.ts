import autocannon from "autocannon";

/** As many tablets hand in at once. */
export const CONNECTIONS = 16;

/** One request to make: its path, who sends it, and its body. */
export interface Shot {
  path: string;
  cookie?: string;
  body: string;
}

/** How a run went: requests a second and, in milliseconds, how many of a hundred waited at most. */
export interface Run {
  perSecond: number;
  p50: number;
  p99: number;
}

/** Also what 97.5 of a hundred waited at most: where that keeps to a limit for 95, those do too. */
export interface PacedRun extends Run {
  p975: number;
}

/** How shots are sent: the status that they must get, and how many a second at most. */
interface Pace {
  status?: number;
  rate?: number;
}

/** Sends every shot once, over as many connections as there are tablets. */
export async function fire(
  url: string,
  shots: readonly Shot[],
  { status = 200, rate }: Pace = {},
): Promise<PacedRun> {
  const counts = new Map<number, number>();
  let next = 0;
  const started = performance.now();
  const result = await autocannon({
    url,
    connections: Math.min(CONNECTIONS, shots.length),
    amount: shots.length,
    ...(rate ? { overallRate: rate } : {}),
    timeout: 120, // seconds: a slow answer is measured, not given up
    requests: [
      {
        method: "POST",
        setupRequest: (request) => {
          const { path, cookie = "", body } = shots[next++ % shots.length]!;
          const headers = { "content-type": "application/json", cookie };
          return { ...request, path, body, headers };
        },
        onResponse: (got) => counts.set(got, (counts.get(got) ?? 0) + 1),
      },
    ],
  });
  const seconds = (performance.now() - started) / 1000;
  if (counts.get(status) !== shots.length)
    throw new Error(
      `${shots[0]?.path}: not all answered ${status}: ${JSON.stringify([...counts])}`,
    );
  const { p50, p97_5: p975, p99 } = result.latency;
  return { perSecond: shots.length / seconds, p50, p975, p99 };
}
