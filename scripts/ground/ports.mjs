import { createHash } from "node:crypto";
import { createServer } from "node:net";

/** Ports from here on, below Linux's ephemeral range, are tried for a cluster. */
const FIRST = 20_000;
const COUNT = 10_000;

/** The port that a folder asks for first: always the same one, so that clones stay apart. */
export function portOf(folder) {
  const sum = createHash("sha256").update(folder).digest().readUInt32BE(0);
  return FIRST + (sum % COUNT);
}

/** Tells whether a port of this address can be listened on now. */
export function isFree(port, host = "127.0.0.1") {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once("error", () => resolve(false));
    probe.listen(port, host, () => probe.close(() => resolve(true)));
  });
}

/** Finds the first free port from `port` on, within the range for clusters. */
export async function freePortFrom(port) {
  for (let step = 0; step < COUNT; step += 1) {
    const candidate = FIRST + ((port - FIRST + step) % COUNT);
    if (await isFree(candidate)) return candidate;
  }
  throw new Error(`No port between ${FIRST} and ${FIRST + COUNT - 1} is free on 127.0.0.1.`);
}
