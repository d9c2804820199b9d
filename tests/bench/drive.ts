import autocannon from "autocannon";

/** As many tablets hand in at once. */
export const CONNECTIONS = 16;

/** One request to make: its path, who sends it, and its body. */
export interface Shot {
  path: string;
  cookie?: string;
  body: string;
}

/** How a run went: requests a second and, in milliseconds, what half and 99 of 100 waited at most. */
export interface Run {
  perSecond: number;
  p50: number;
  p99: number;
}

/** Sends every shot once, over as many connections as there are tablets, and expects `status`. */
export async function fire(url: string, shots: readonly Shot[], status = 200): Promise<Run> {
  const counts = new Map<number, number>();
  let next = 0;
  const started = performance.now();
  const result = await autocannon({
    url,
    connections: Math.min(CONNECTIONS, shots.length),
    amount: shots.length,
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
  const { p50, p99 } = result.latency;
  return { perSecond: shots.length / seconds, p50, p99 };
}
