import { mkdtempSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { identityOf, isAlive, recordIn } from "@/scripts/ground/process-record.mjs";

const folder = mkdtempSync(path.join(tmpdir(), "bookmatch-record-"));
afterAll(() => rmSync(folder, { recursive: true }));

describe("isAlive", () => {
  test("knows a running process by its number and its start", () => {
    expect(isAlive(identityOf(process.pid))).toBe(true);
  });
  test("takes another process that got the number later for a stranger", () => {
    expect(isAlive({ pid: process.pid, ticks: "1" })).toBe(false);
  });
  test("is no for nobody, and for a process that never was", () => {
    expect(isAlive(undefined)).toBe(false);
    expect(isAlive(identityOf(2 ** 22 + 1))).toBe(false);
  });
});

describe("recordIn", () => {
  test("adds to what it holds, for its owner's eyes alone", () => {
    const file = path.join(folder, "running.json");
    const record = recordIn(file);
    record.write({ address: "http://127.0.0.1:3000" });
    record.write({ greeting: "hello" });
    expect(record.read()).toEqual({ address: "http://127.0.0.1:3000", greeting: "hello" });
    expect(statSync(file).mode & 0o777).toBe(0o600);
    record.remove();
    expect(record.read()).toBeNull();
  });
  test("does not take one that it cannot read for none: somebody runs it", () => {
    const file = path.join(folder, "another.json");
    writeFileSync(file, "{}");
    const denied = Object.assign(new Error("permission denied"), { code: "EACCES" });
    const read = () => {
      throw denied;
    };
    expect(() => recordIn(file, read).read()).toThrow("Another user runs this Bookmatch");
  });
  test("reads one that was cut off as none", () => {
    const file = path.join(folder, "cut.json");
    writeFileSync(file, '{"supervisor": {"pid"');
    expect(recordIn(file).read()).toBeNull();
  });
});
