import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { bookedTime, operationSheetOf, type TicketSteps } from "@/lib/sheet/operation-sheet";
import { operationSheet, type TimePiece } from "@/lib/sheet/schema";
import { sum } from "@/lib/sum";
import { makeSaidAct, steps } from "@/tests/make/sheet";

const item = { ticket: "26048176", operation: "495" };
const piece = (start: number, end: number | null, other: Partial<TimePiece> = {}): TimePiece => ({
  worker: "1042",
  start,
  end,
  seconds: end === null ? null : end - start,
  weights: end === null ? [1] : [],
  item: 0,
  ...other,
});
const stepped = (...said: TicketSteps["said"]): TicketSteps => ({
  ticket: item.ticket,
  steps: steps.map((step) => ({ ...step, operation: item.operation })),
  said,
});
const operation = { operation: "495", standardSeconds: 1440, isFinished: false };

describe("operationSheetOf", () => {
  test("tells steps, what they follow from, and what was not tapped off yet", () => {
    const done = makeSaidAct(8, { kind: "step-done", ...item, step: "1" });
    const time = [piece(0, 600), piece(600, null)];
    const sheet = operationSheetOf(stepped(done), { ...operation, time }, 700_900);
    expect(operationSheet.parse(sheet)).toMatchObject({
      notTappedSeconds: 220,
      handOver: null,
      steps: [
        {
          step: "1",
          state: "done",
          actualSeconds: 480,
          seconds: 480,
          at: "1970-01-01T00:08:00.000Z",
        },
        { step: "2", state: "open", actualSeconds: 0, standardSeconds: 360, at: null },
        { step: "3", state: "open" },
      ],
    });
  });
  test("a copy that is kept leaves out what runs", () => {
    const time = [piece(0, 600), piece(600, null)];
    expect(operationSheetOf(stepped(), { ...operation, time }, null)?.notTappedSeconds).toBe(600);
  });
  test("an operation without steps has no sheet", () => {
    expect(operationSheetOf(stepped(), { ...operation, operation: "500", time: [] }, 0)).toBeNull();
  });
  test("what was handed over is asked about until the operation is finished", () => {
    const handed = makeSaidAct(8, { kind: "hand-over", ...item, to: "1077" });
    const open = { ...operation, time: [] };
    expect(operationSheetOf(stepped(handed), open, 0)?.handOver?.to).toBe("1077");
    const finished = { ...open, isFinished: true };
    expect(operationSheetOf(stepped(handed), finished, 0)?.handOver).toBeNull();
  });
});

describe("bookedTime", () => {
  test("what runs on several tickets counts by its share, as if it ended now", () => {
    expect(bookedTime([piece(0, null, { weights: [1, 3], item: 1 })], 100)).toEqual([
      { start: 0, end: 100, seconds: 75 },
    ]);
  });
  test("what begins later than it is asked for is none", () => {
    expect(bookedTime([piece(100, null)], 100)).toEqual([]);
  });
  test("for any instant, what has ended counts in full and what runs never more than has passed", () => {
    fc.assert(
      fc.property(fc.nat(1_000), fc.nat(1_000), (from, until) => {
        const seconds = sum(
          bookedTime([piece(0, 50), piece(from, null)], until).map((one) => one.seconds),
        );
        expect(seconds).toBe(50 + Math.max(0, until - from));
      }),
    );
  });
});
