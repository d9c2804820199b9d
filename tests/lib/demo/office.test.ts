import { describe, expect, test } from "vitest";
import { spelledPassword } from "@/lib/access/password";
import { roles } from "@/lib/access/roles";
import { cast } from "@/lib/demo/cast";
import { cells } from "@/lib/demo/cells";
import { office } from "@/lib/demo/office";

describe("office", () => {
  test("has somebody in every role, with an address and a password of at least 15 characters", () => {
    expect(new Set(office.flatMap((member) => member.roles))).toEqual(new Set(roles));
    expect(new Set(office.map(({ email }) => email)).size).toBe(office.length);
    for (const { email, password } of office) {
      expect(email).toMatch(/^[a-z]+(\.[a-z]+)+@larkmoor\.example$/);
      expect(spelledPassword(password).length).toBeGreaterThanOrEqual(15);
    }
  });

  test("every cell has a lead who signs in, and leads alone have cells", () => {
    const led = office.flatMap((member) => member.cells);
    expect(new Set(led)).toEqual(new Set(cells.map(({ name }) => name)));
    for (const member of office) {
      expect(member.cells.length > 0).toBe(member.roles.includes("lead"));
    }
  });

  test("whoever clocks labour too is of the cast, under the own number", () => {
    const clocking = office.filter(({ roles: held }) =>
      held.some((role) => role === "lead" || role === "inspector" || role === "worker"),
    );
    for (const { name, worker } of clocking) {
      expect(cast.find(({ number }) => number === worker)?.name).toBe(name);
    }
  });
});
