import { expect, test } from "vitest";
import { standardItemOf } from "@/lib/standards/item";

test("standardItemOf says when it was entered, and not by whom", () => {
  const item = {
    id: "01a2327a-ce56-70c9-b8cc-64010002011f",
    model: "Heron",
    operation: "110",
    operationName: "Carve neck",
    option: null,
    setupSeconds: 360,
    runSeconds: 4920,
    effectiveFrom: "2026-05-18",
    reason: "Time study",
  };
  const row = { ...item, seq: 7, enteredBy: "Ilo Varn", enteredAt: new Date(1_778_763_600_000) };
  expect(standardItemOf(row)).toEqual({ ...item, enteredAt: "2026-05-14T13:00:00.000Z" });
});
