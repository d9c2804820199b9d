import { z } from "zod";
import { localTime } from "@/lib/ends/schema";
import { chosen, formId, line } from "@/lib/forms";
import { workerNumber } from "@/lib/ledger/schema";

const own = { id: formId, worker: workerNumber, reason: line(300) };

/** A shift that somebody forgot to start or to end. */
export const shiftForm = z.strictObject({
  ...own,
  deed: z.enum(["shift-start", "shift-end"]),
  time: localTime,
});
export type ShiftForm = z.infer<typeof shiftForm>;

/** A record that is moved to its right time, or taken out. */
export const recordForm = z.strictObject({
  ...own,
  event: chosen,
  deed: z.enum(["move", "void"]),
  time: localTime.default(""),
});
export type RecordForm = z.infer<typeof recordForm>;
