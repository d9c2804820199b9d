import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { secretsIn } from "@/scripts/ground/secrets.mjs";

const folder = mkdtempSync(path.join(tmpdir(), "bookmatch-secrets-"));
const file = path.join(folder, "secrets.json");
afterAll(() => rmSync(folder, { recursive: true }));

describe("secretsIn", () => {
  test("makes them once, long enough, and keeps them for their owner alone", () => {
    const made = secretsIn(folder);
    expect(made.session.length).toBeGreaterThanOrEqual(32);
    expect(new Set(Object.values(made)).size).toBe(Object.keys(made).length);
    expect(secretsIn(folder)).toEqual(made);
    expect(statSync(file).mode & 0o777).toBe(0o600);
  });
  test("adds one that a later version needs and leaves the others", () => {
    const { owner, ...older } = secretsIn(folder);
    writeFileSync(file, JSON.stringify(older));
    const renewed = secretsIn(folder);
    expect(renewed).toMatchObject(older);
    expect(renewed.owner).not.toBe(owner);
    expect(JSON.parse(readFileSync(file, "utf8"))).toEqual(renewed);
  });
});
