import { describe, expect, test } from "vitest";
import { agreementOf, agreementSubject, readAgreement } from "@/lib/agreement/signatures";

const now = "a".repeat(64);
const before = "b".repeat(64);
const date = "2026-05-14";
const confirm = (atMs: number, by: string | null, digest = now, on = date) => ({
  atMs,
  by,
  subject: agreementSubject(on, digest),
});

describe("readAgreement", () => {
  test("reads what `agreementSubject` wrote", () => {
    expect(readAgreement(agreementSubject(date, now))).toEqual({ date, digest: now });
  });
  test.each(["", "workday:2026-05-14", `workday:2026-05-14:${"A".repeat(64)}`, `x:${date}:${now}`])(
    "%j is about something else",
    (subject) => expect(readAgreement(subject)).toBeNull(),
  );
});

describe("agreementOf", () => {
  const day = { date, digest: now };

  test("tells the worker's from the lead's, and takes the latest of each", () => {
    const confirms = [confirm(1, null), confirm(3, "lead"), confirm(2, null), confirm(4, "pay")];
    expect(agreementOf(confirms, day)).toEqual({
      worker: { atMs: 2, by: null },
      lead: { atMs: 4, by: "pay" },
      hasLapsed: false,
    });
  });

  test("nobody has agreed yet, and so nothing lapsed", () => {
    expect(agreementOf([], day)).toEqual({ worker: null, lead: null, hasLapsed: false });
  });

  test("lapses with the digest, for each by themselves", () => {
    const changed = agreementOf([confirm(1, null, before), confirm(2, "lead", before)], day);
    expect(changed).toEqual({ worker: null, lead: null, hasLapsed: true });
    const again = agreementOf(
      [confirm(1, null, before), confirm(2, "lead", before), confirm(3, "lead")],
      day,
    );
    expect(again).toEqual({ worker: null, lead: { atMs: 3, by: "lead" }, hasLapsed: true });
  });

  test("holds again where the day was put back as it was", () => {
    const confirms = [confirm(1, "lead"), confirm(2, "lead", before)];
    expect(agreementOf(confirms, day)).toMatchObject({ lead: { atMs: 1 }, hasLapsed: false });
  });

  test("another day's agreement is not this one's", () => {
    expect(agreementOf([confirm(1, "lead", now, "2026-05-13")], day).lead).toBeNull();
  });
});
