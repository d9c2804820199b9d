import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { splitRequest } from "@/lib/api/split";
import { sum } from "@/lib/sum";
import { split } from "@/lib/timeline/split";

const issueOf = (request: unknown) => splitRequest.safeParse(request).error?.issues[0];

describe("splitRequest", () => {
  test("for any request that it takes, the split answers and loses nothing", () => {
    const whole = fc.oneof(fc.nat(100), fc.maxSafeNat(), fc.constant(0));
    const requests = fc.record({ seconds: whole, weights: fc.array(whole, { maxLength: 8 }) });
    fc.assert(
      fc.property(requests, (request) => {
        fc.pre(splitRequest.safeParse(request).success);
        expect(sum(split(request.seconds, request.weights))).toBe(request.seconds);
      }),
    );
  });
  test.each([
    { seconds: 10, weights: [1, 1, 1] },
    { seconds: 0, weights: [0] },
    { seconds: Number.MAX_SAFE_INTEGER, weights: [0, 1] },
  ])("takes %j", (request) => expect(splitRequest.parse(request)).toEqual(request));
  test.each([
    [{ seconds: -1, weights: [1] }, ["seconds"]],
    [{ seconds: 1.5, weights: [1] }, ["seconds"]],
    [{ seconds: "10", weights: [1] }, ["seconds"]],
    [{ seconds: 10, weights: [] }, ["weights"]],
    [{ seconds: 10, weights: [1, -1] }, ["weights", 1]],
    [{ seconds: 10, weights: [0.5] }, ["weights", 0]],
    [{ seconds: 10, weights: Array.from({ length: 10_001 }, () => 1) }, ["weights"]],
  ])("refuses %j at %j", (request, path) => expect(issueOf(request)?.path).toEqual(path));
  test("refuses what cannot be shared exactly, and says what to do", () => {
    const huge = { seconds: 2 ** 40, weights: [2 ** 40, 1] };
    expect(issueOf(huge)).toMatchObject({ path: ["weights"], code: "custom" });
    expect(issueOf(huge)?.message).toContain("Too large to share exactly");
    expect(issueOf({ seconds: 1, weights: [2 ** 52, 2 ** 52] })?.path).toEqual(["weights"]);
    expect(issueOf({ seconds: 2 ** 52, weights: [0, 0] })?.path).toEqual(["weights"]);
  });
});
