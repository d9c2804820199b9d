import { describe, expect, test } from "vitest";
import { choiceForm, policyForm, rhythmForm } from "@/lib/policies/schema";

const asked = {
  name: "shop",
  rules: '{"overtime":{"weekly":[{"overHours":38,"bucket":"overtime"}]}}',
  effectiveOn: "2026-06-01",
  reason: "agreed in May",
  after: "0",
};
const messages = (form: { safeParse: typeof policyForm.safeParse }, value: unknown) =>
  form.safeParse(value).error?.issues.map(({ message }) => message);

describe("policyForm", () => {
  test("reads a site's own rules; what they leave out is as in every policy", () => {
    const { name, policy, after } = policyForm.parse(asked);
    expect({ name, after }).toEqual({ name: "shop", after: 0 });
    expect(policy.overtime.weekly).toEqual([{ overHours: 38, bucket: "overtime" }]);
    expect(policy.breaks.restPaidUpToMinutes).toBe(20);
  });
  test("takes a preset by its name, with no rules of one's own", () => {
    const { policy } = policyForm.parse({ ...asked, name: "us-california", rules: " " });
    expect(policy.limits).toBe("us-california");
  });
  test("a policy without tiers is one: everything is regular time", () => {
    expect(policyForm.parse({ ...asked, rules: "{}" }).policy.overtime).toEqual({
      daily: [],
      weekly: [],
      seventhDay: [],
    });
  });
  test.each([
    [{ rules: "" }, "name a preset"],
    [{ rules: "{" }, "expected object"],
    [{ rules: '{"overtime":{"weekly":[{"overHours":-1,"bucket":"overtime"}]}}' }, "weekly.0.over"],
    [{ rules: '{"workday":1}' }, "Unrecognized key"],
    [{ name: "Shop rules" }, "small letters"],
    [{ effectiveOn: "1 June" }, "Give a date."],
    [{ reason: " " }, "Fill this in."],
  ])("%j: %s", (change, message) => {
    expect(messages(policyForm, { ...asked, ...change })?.join()).toContain(message);
  });
});

describe("choiceForm", () => {
  const choice = {
    id: "01890a5d-ac96-774b-bcce-b302099a8057",
    worker: "",
    policy: "shop",
    effectiveOn: "2026-06-01",
    reason: "moved",
  };
  test("is for the site, or for one worker by number", () => {
    expect(choiceForm.safeParse(choice).success).toBe(true);
    expect(choiceForm.safeParse({ ...choice, worker: "1042" }).success).toBe(true);
  });
  test("refuses what is no number", () => {
    const { error } = choiceForm.safeParse({ ...choice, worker: "Ilo" });
    expect(error?.message).toContain("digits only");
  });
});

describe("rhythmForm", () => {
  test.each([
    ["0", "At least one day."],
    ["63", "At most 62 days."],
  ])("%s days: %s", (days, message) => {
    const id = "01890a5d-ac96-774b-bcce-b302099a8057";
    const asked = { id, startsOn: "2026-06-01", days, reason: "from the handbook" };
    expect(rhythmForm.safeParse(asked).error?.message).toContain(message);
  });
});
