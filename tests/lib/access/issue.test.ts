import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { drawEnrolmentCode, drawPassword, shownEnrolmentCode } from "@/lib/access/issue";
import { enrolRequest } from "@/lib/kiosks/schema";

const chance = fc.infiniteStream(fc.nat(1_000_000));
const drawFrom = (stream: Iterator<number>) => (below: number) => stream.next().value % below;

describe("drawPassword", () => {
  test("for any chance, it has four groups of five clear letters and digits", () => {
    fc.assert(
      fc.property(chance, (stream) => {
        expect(drawPassword(drawFrom(stream))).toMatch(/^([a-z2-9]{5}-){3}[a-z2-9]{5}$/);
      }),
    );
  });

  test("no character that is easily mistaken is in it", () => {
    const every = drawPassword(drawFrom([...Array(27).keys()][Symbol.iterator]()));
    expect(every).toBe("acdef-ghjkm-npqrt-uvwxy");
  });
});

describe("drawEnrolmentCode", () => {
  test("for any chance, the code is taken as it is shown, and in small letters", () => {
    fc.assert(
      fc.property(chance, (stream) => {
        const code = drawEnrolmentCode(drawFrom(stream));
        expect(code).toHaveLength(8);
        const shown = shownEnrolmentCode(code);
        expect(enrolRequest.parse({ code: shown })).toEqual({ code });
        expect(enrolRequest.parse({ code: shown.toLowerCase() })).toEqual({ code });
      }),
    );
  });
});
