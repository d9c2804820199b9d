import { z } from "zod";

/** Who a person of the office, a key or a kiosk session can be. */
export const role = z.enum(["admin", "planner", "lead", "inspector", "payroll", "worker"]);
export type Role = z.infer<typeof role>;
export const roles = role.options;
