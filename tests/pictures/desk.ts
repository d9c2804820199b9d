import { randomUUID } from "node:crypto";
import type { Page } from "@playwright/test";
import { type KioskCell, type SignedIn, signedIn } from "@/lib/kiosks/schema";
import type { EventBody } from "@/lib/ledger/schema";
import { ask } from "@/tests/setup/clone";
import type { Installation, SignIns } from "@/tests/setup/installation";

/** Somebody of the demo who is not in, with a token of the server's. */
export interface Person {
  worker: string;
  pin: string;
  session: string;
  token: string;
}

const MINUTE_MS = 60_000;

/** Makes the page's browser a kiosk of a cell, and reads what it then knows of it. */
export async function enrol(page: Page, bookmatch: Installation, cell: string): Promise<KioskCell> {
  const [code = ""] = (await bookmatch.command("enrol.ts", "--cell", cell)).split("\n");
  await page.goto(`/kiosk/enrol?code=${code}`);
  await page.getByRole("button").first().click();
  await page.getByRole("button", { name: "7", exact: true }).waitFor();
  return (await page.request.get("/api/kiosk/cell")).json();
}

/** Signs people in until so many are found who are out: a picture's shift is its own. */
export async function findPeopleOut(page: Page, { workers }: SignIns, count: number) {
  const out: Person[] = [];
  for (const { worker, pin } of workers) {
    if (out.length === count) break;
    const session = randomUUID();
    const body = { session, worker, pin };
    const answer = await page.request.post("/api/kiosk/sign-in", { data: body });
    const known: SignedIn = signedIn.parse(await answer.json());
    if (!known.bench.shift) out.push({ worker, pin, session, token: known.token });
  }
  return out;
}

/** Hands in what somebody did some minutes ago, in order, as a tablet would. */
export async function did(page: Page, who: Person, acts: readonly [number, EventBody][]) {
  const { worker, session, token } = who;
  const boot = randomUUID();
  const events = acts.map(([minutesAgo, body], seq) => ({
    id: randomUUID(),
    v: 1,
    session,
    worker,
    at: new Date(Date.now() - minutesAgo * MINUTE_MS).toISOString(),
    clock: { offsetMs: 0, uncertaintyMs: 5, boot, monotonicMs: seq, seq },
    ...body,
  }));
  const answer = await page.request.post("/api/kiosk/events", {
    headers: { authorization: `Bearer ${token}` },
    data: { events, deviceTime: new Date().toISOString() },
  });
  if (!answer.ok()) throw new Error(`The acts of ${worker} were refused: ${await answer.text()}`);
}

/** Every operation that is next here and that nobody is on, in due order. */
export function readyHere({ tickets }: KioskCell) {
  return tickets.flatMap(({ ticket, operations }) => {
    const ready = operations.find(
      ({ here, obstacles, workers }) => here && obstacles.length === 0 && workers.length === 0,
    );
    if (!ready) return [];
    const { operation, runSeconds, setupSeconds, openQuantity } = ready;
    const standardSeconds = (setupSeconds ?? 0) + (runSeconds ?? 0) * openQuantity;
    const standardMinutes = Math.round(standardSeconds / 60);
    return [{ ticket, operation, standardMinutes, hasSetup: (setupSeconds ?? 0) > 0 }];
  });
}

/** A ticket that is next in another cell. */
export async function ticketElsewhere({ ownerUrl }: Installation, cell: string): Promise<string> {
  const { rows } = await ask(
    ownerUrl,
    `select t.number
       from tickets t
       join ticket_operations o on o.ticket_id = t.id and o.state = 'ready'
       join operations p on p.id = o.operation_id
       join cells c on c.id = p.cell_id
      where t.status = 'open' and c.name <> $1
      limit 1`,
    [cell],
    "",
  );
  return String(rows[0]?.number);
}
