import { eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { sites } from "@/db/sites/tables";
import { cast } from "@/lib/demo/cast";
import { cells } from "@/lib/demo/cells";
import { office } from "@/lib/demo/office";

/** The demo's site has an id of its own, so that it is never taken for somebody's factory. */
export const DEMO_SITE_ID = "0193d5a0-0000-7000-8000-1a2b3c4d5e6f";

/** Whoever may sign in to the demo, with what it takes: shown and printed in the demo alone. */
export interface DemoSignIns {
  office: { email: string; password: string; role: string }[];
  workers: { worker: string; pin: string; cell: string }[];
  cells: string[];
}

/** Finds the demo's sign-ins; null where the demo is not loaded. Changed PINs are not followed. */
export async function findDemoSignIns(db: Db): Promise<DemoSignIns | null> {
  const [demo] = await db.select({ id: sites.id }).from(sites).where(eq(sites.id, DEMO_SITE_ID));
  return demo ? demoSignIns() : null;
}

/** The sign-ins that the demo is loaded with: the first role of each account, workers by number. */
export function demoSignIns(): DemoSignIns {
  return {
    office: office.map(({ email, password, roles: [role = "worker"] }) => ({
      email,
      password,
      role,
    })),
    workers: cast.map(({ number, pin, cell }) => ({ worker: number, pin, cell })),
    cells: cells.map(({ name }) => name),
  };
}
