import { z } from "zod";
import { chosen, dateOrNone, formId, line, lineOrNone, sought } from "@/lib/forms";
import { language } from "@/lib/kiosks/schema";
import { workerNumber } from "@/lib/ledger/schema";

/** What People asks of a worker, new or changed. The last day is a site date. */
export const workerForm = z.strictObject({
  id: formId,
  number: workerNumber,
  name: line(80),
  cell: chosen,
  language,
  payrollNumber: lineOrNone(40),
  endsOn: dateOrNone,
});
export type WorkerForm = z.infer<typeof workerForm>;

/** A worker who gets a new PIN. */
export const pinForm = z.strictObject({ worker: workerNumber });

/** What is shown once: the PIN, and whose it is. */
export interface GivenPin {
  number: string;
  name: string;
  pin: string;
}

/** Which workers People lists: part of a name or number, a cell, those who left too. */
export const peopleQuery = z.object({
  q: sought(80),
  cell: z.uuid().or(z.literal("")).catch(""),
  left: z.literal("1").or(z.literal("")).catch(""),
  after: workerNumber.or(z.literal("")).catch(""),
});
export type PeopleQuery = z.infer<typeof peopleQuery>;
