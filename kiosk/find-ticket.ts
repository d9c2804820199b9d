import { ask } from "@/kiosk/server";
import type { World } from "@/kiosk/world";
import { kioskTicket } from "@/lib/kiosks/schema";

/** A person holds the ticket before the screen: longer than this is as good as away. */
const TIMEOUT_MS = 2500;

/** Looks a ticket up at the server, else among those that this tablet keeps of its cells. */
export async function findTicketAnywhere(
  world: World,
  code: string,
  worker: string,
): Promise<void> {
  const token = world.state().sessions[worker]?.token;
  const answer = token
    ? await ask(
        {
          path: `/api/kiosk/tickets/${encodeURIComponent(code)}`,
          token,
          answer: kioskTicket,
          timeoutMs: TIMEOUT_MS,
        },
        world.fetcher,
      )
    : ({ came: "nothing" } as const);
  if (answer.came === "answer") return world.send({ on: "ticket", code, ticket: answer.value });
  const kept = world.state().cell?.tickets.find(({ ticket }) => ticket === code);
  const isKnownGone = answer.came === "problem" && answer.status === 404;
  if (kept && !isKnownGone) return world.send({ on: "ticket", code, ticket: kept });
  const away = answer.came === "nothing" || (answer.came === "problem" && answer.status === 401);
  world.send({ on: "no-ticket", code, away });
}
