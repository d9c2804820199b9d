import { hashPassword } from "@/app/_server/password";
import type { Db } from "@/db/client";
import { loadDemo } from "@/db/seed/load";
import type { DemoSignIns } from "@/db/seed/sign-ins";
import { Refusal, say } from "./connect";

/** How many of the workers a start prints; `npm run demo` prints all. */
const SHOWN_WORKERS = 5;

/** Loads the demo scenario and says how far it has come. */
export async function loadWithProgress(db: Db): Promise<void> {
  say("Loading the demo scenario: eight weeks of an invented factory (about a minute) …");
  let shown = "";
  const loaded = await loadDemo({
    db,
    now: new Date(),
    hash: hashPassword,
    onProgress: (step, share) => {
      const tenths = Math.floor(share * 10);
      const line = tenths === 0 ? `  ${step}` : `  ${step}: ${tenths}0 %`;
      if (line !== shown) say(line);
      shown = line;
    },
  });
  if (!loaded.ok) throw new Refusal(loaded.problem.detail);
  say(`  ${loaded.value.tickets} tickets, ${loaded.value.events} taps.`);
}

/** Writes the sign-ins of the demo for a person to read; without `all`, a few of the workers. */
export function readable({ office, workers }: DemoSignIns, all: boolean): string {
  const shown = all ? workers : someOfEachCell(workers);
  const rest = workers.length - shown.length;
  return [
    "Demo sign-ins, office (/sign-in):",
    ...office.map(({ email, password, role }) => `  ${role.padEnd(10)} ${email}  ${password}`),
    "Demo sign-ins, kiosk (/kiosk; npm run enrol -- --cell NAME gives a code for a tablet):",
    ...shown.map(({ worker, pin, cell }) => `  ${worker}  PIN ${pin}  ${cell}`),
    ...(rest > 0 ? [`  and ${rest} more: npm run demo`] : []),
  ].join("\n");
}

function someOfEachCell(workers: DemoSignIns["workers"]) {
  const cells = [...new Set(workers.map(({ cell }) => cell))].slice(0, SHOWN_WORKERS);
  return cells.flatMap((cell) => workers.find((worker) => worker.cell === cell) ?? []);
}
