import type { Role } from "@/lib/access/roles";

/** How far a permission reaches: the whole site, the person's own cells, or the person alone. */
export type Reach = "site" | "cells" | "self";

/**
 * Who may do what, and how far. The only table of permissions: every page, action and route handler
 * names its action here, and a test walks them all. An analytic figure stops at the cell; a
 * person's own hours are for that person, the lead of the home cell and payroll.
 */
export const permissions = {
  "floor.see": { admin: "site", planner: "site", lead: "site", inspector: "site", payroll: "site" },
  "tickets.see": { admin: "site", planner: "site", lead: "site", inspector: "site" },
  "people.see": { admin: "site", lead: "cells", payroll: "site" },
  "people.change": { admin: "site" },
  "people.reset-pin": { admin: "site", lead: "cells" },
  "people.give-roles": { admin: "site" },
  "kiosks.see": { admin: "site" },
  "kiosks.change": { admin: "site" },
  "hours.see": { payroll: "site", lead: "cells", worker: "self" },
  "hours.export": { payroll: "site", lead: "cells" },
  "hours.agree": { lead: "cells" },
  "ends.see": { admin: "site", payroll: "site", lead: "cells" },
  "ends.settle": { admin: "site", payroll: "site", lead: "cells" },
  "me.see": {
    admin: "self",
    planner: "self",
    lead: "self",
    inspector: "self",
    payroll: "self",
    worker: "self",
  },
  "me.answer": {
    admin: "self",
    planner: "self",
    lead: "self",
    inspector: "self",
    payroll: "self",
    worker: "self",
  },
  "periods.see": { payroll: "site", lead: "cells" },
  "periods.close": { payroll: "site" },
  "periods.export": { payroll: "site" },
  "policies.see": { payroll: "site", admin: "site" },
  "policies.change": { payroll: "site", admin: "site" },
  "account.change": {
    admin: "self",
    planner: "self",
    lead: "self",
    inspector: "self",
    payroll: "self",
    worker: "self",
  },
  "tickets.read": { planner: "site", lead: "site" },
  "segments.read": { planner: "site" },
  "segments.name-people": { payroll: "site" },
  "records.correct": { lead: "cells", payroll: "site" },
  "standards.see": { planner: "site", lead: "site" },
  "standards.set": { planner: "site" },
  "standards.read": { planner: "site" },
  "analytics.see": { admin: "site", planner: "site", lead: "cells" },
  "analytics.read": { planner: "site", lead: "site" },
  calculate: { planner: "site" },
  "calculate.pay": { payroll: "site" },
} as const satisfies Record<string, Partial<Record<Role, Reach>>>;

export type Action = keyof typeof permissions;

/** A role that someone holds; a lead's names the cells it is for. */
export interface Held {
  role: Role;
  cells: readonly string[];
}

/**
 * Answers how far someone with these roles may go with an action; null means not at all.
 * The widest reach wins: site before cells before self.
 */
export function reachOf(held: readonly Held[], action: Action): Reach | null {
  const table: Partial<Record<Role, Reach>> = permissions[action];
  const reaches = held.map(({ role }) => table[role]);
  return (["site", "cells", "self"] as const).find((reach) => reaches.includes(reach)) ?? null;
}

/** The cells that someone leads: what reach `cells` means for them. */
export function cellsOf(held: readonly Held[]): string[] {
  return [...new Set(held.filter(({ role }) => role === "lead").flatMap(({ cells }) => cells))];
}
