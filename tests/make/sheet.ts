import type { KioskTicket } from "@/lib/kiosks/schema";
import type { Step } from "@/lib/sheet/cell-sheet";
import type { OperationSheet } from "@/lib/sheet/schema";
import type { BookedTime } from "@/lib/sheet/step-times";
import type { SaidAct, StepTap, TapKind } from "@/lib/sheet/taps";
import { cell, numbered, operationOf, TestKiosk, ticketOf } from "@/tests/make/bench";

/** Two instruments of the neck cell that are built in steps. */
export const BASS = { ticket: numbered("2605007"), operation: "495" };
export const ARCHTOP = { ticket: numbered("2605008"), operation: "495" };

/** What the server says of an operation's sheet before anything was tapped. */
export function makeOperationSheet(other: Partial<OperationSheet> = {}): OperationSheet {
  return {
    steps: steps.map((step) => ({
      ...step,
      standardSeconds: step.seconds,
      state: "open",
      actualSeconds: 0,
      together: false,
      at: null,
      reason: null,
    })),
    notTappedSeconds: 0,
    taps: [],
    time: [],
    handOver: null,
    ...other,
  };
}

/** One of the two instruments, begun, with its sheet. */
export function builtTicket(
  { ticket, operation }: { ticket: string; operation: string },
  sheet: Partial<OperationSheet> = {},
): KioskTicket {
  const built = operationOf({
    operation,
    name: "Assemble whole instrument",
    state: "working",
    setupSeconds: 0,
    runSeconds: 1440,
    quantity: 1,
    openQuantity: 1,
    sheet: makeOperationSheet(sheet),
  });
  return ticketOf(ticket, [built]);
}

/** A kiosk that knows these instruments too; Nia stands before her bench. */
export function kioskWith(...built: KioskTicket[]): TestKiosk {
  const colleague = { ...cell.people[0]!, worker: "1077", name: "Ilo Varn" };
  const people = [...cell.people, colleague];
  const kiosk = TestKiosk.atDoor();
  return kiosk.send({
    on: "cell",
    cell: { ...cell, people, tickets: [...cell.tickets, ...built] },
  });
}

/** Three steps of an instrument, of 8, 6 and 10 minutes. */
export const steps: readonly Step[] = [
  { step: "1", name: "Fit bridge", seconds: 480 },
  { step: "2", name: "Bushings and tuners", seconds: 360 },
  { step: "3", name: "Solder and test", seconds: 600 },
];

/** A tap on a step at a minute; it weighs what its step takes. */
export function makeStepTap(
  step: string,
  minute: number,
  { kind = "done", ...other }: Partial<StepTap> & { kind?: TapKind } = {},
): StepTap {
  return {
    event: `${kind}-${step}-${minute}`,
    kind,
    step,
    worker: "1042",
    atMs: minute * 60_000,
    weight: steps.find((one) => one.step === step)?.seconds ?? 1,
    reason: null,
    ...other,
  };
}

/** Time between two minutes, all of it on the operation unless it is told otherwise. */
export function makeTime([from, to]: [number, number], seconds?: number): BookedTime {
  return { start: from * 60, end: to * 60, seconds: seconds ?? (to - from) * 60 };
}

/** An act of worker 1042 on ticket 26048176, operation 495, at a minute. */
export function makeSaidAct(
  minute: number,
  body: SaidAct["body"],
  other: Partial<SaidAct> = {},
): SaidAct {
  return {
    id: `act-${minute}`,
    atMs: minute * 60_000,
    seq: minute,
    kiosk: "kiosk",
    session: "session",
    cell: "assembly",
    by: null,
    receivedMs: minute * 60_000,
    weights: [],
    questions: [],
    body,
    out: [],
    closes: null,
    worker: "1042",
    note: null,
    ...other,
  };
}
