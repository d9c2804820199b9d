import type { Scope } from "@/db/client";
import type { Settling } from "@/db/ends/commands";
import { bookDeed } from "@/db/ledger/office";
import { toldTime } from "@/lib/ends/told-time";
import { insertOf } from "@/lib/ends/ways";
import type { BookingContext } from "@/lib/ledger/context";
import type { EventBody } from "@/lib/ledger/schema";
import type { RecordForm, ShiftForm } from "@/lib/records/schema";
import { shiftRefusal } from "@/lib/records/shift-refusal";
import { no, type Problem, type Result } from "@/lib/result";
import { clockText } from "@/lib/time/format";
import { ruleAt } from "@/lib/time/site-day";

/** Starts or ends a shift for someone who forgot, at the time that is told, with the reason. */
export async function enterShift(
  scope: Scope,
  { id, worker, deed, time, reason }: ShiftForm,
  entering: Settling,
): Promise<Result<void>> {
  const told = toldHere(time, entering);
  if (!told.ok) return told;
  const atMs = told.value;
  const { timeZone } = ruleAt(entering.rules, atMs);
  const check = ({ workers, windows }: BookingContext): Problem | null => {
    const own = workers.find(({ number }) => number === worker);
    const window = windows.find(({ workerId }) => workerId === own?.id);
    const clock = (ms: number) => clockText(ms, timeZone);
    const detail = window && shiftRefusal(window, { deed, atMs }, clock);
    return detail ? { code: "conflict", detail } : null;
  };
  return enter(
    scope,
    { id, worker, reason, body: insertOf({ kind: deed }, atMs) },
    entering,
    check,
  );
}

/** Moves a record to its right time, or takes it out, with the reason; the record itself stays. */
export async function correctRecord(
  scope: Scope,
  { id, worker, event, deed, time, reason }: RecordForm,
  entering: Settling,
): Promise<Result<void>> {
  if (deed === "void")
    return enter(scope, { id, worker, reason, body: { kind: "void", event } }, entering);
  const told = toldHere(time, entering);
  if (!told.ok) return told;
  const to = new Date(told.value).toISOString();
  return enter(scope, { id, worker, reason, body: { kind: "move", event, to } }, entering);
}

function toldHere(time: string, { rules, now }: Settling): Result<number> {
  const told = toldTime(time, ruleAt(rules, now.getTime()).timeZone);
  if (!told.ok) return told;
  if (told.value !== null) return { ok: true, value: told.value };
  return no("invalid", "Give the time.", { errors: [{ path: "time", message: "Give the time." }] });
}

async function enter(
  scope: Scope,
  { id, worker, reason, body }: { id: string; worker: string; reason: string; body: EventBody },
  { by, actor, now, within }: Settling,
  check?: (context: BookingContext) => Problem | null,
): Promise<Result<void>> {
  const acts = [{ id, worker, body, note: reason }];
  return bookDeed(scope, { acts, by, actor, now, within, ...(check ? { check } : {}) });
}
