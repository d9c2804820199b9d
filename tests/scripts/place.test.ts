import { chmodSync, mkdirSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeEach, describe, expect, test } from "vitest";
import { anybodyMayEnter, clusterPlace, isRoot } from "@/scripts/ground/place.mjs";

const base = mkdtempSync(path.join(tmpdir(), "bookmatch-place-"));
let data = "";
let elsewhere = "";
let count = 0;

beforeEach(() => {
  chmodSync(base, 0o755);
  count += 1;
  elsewhere = path.join(base, `elsewhere-${count}`);
  data = path.join(base, `clone-${count}/.data`);
  mkdirSync(path.dirname(data));
});
afterAll(() => rmSync(base, { recursive: true }));

describe("anybodyMayEnter", () => {
  test("is yes where every folder on the way lets others walk through, made or not", () => {
    expect(anybodyMayEnter(data)).toBe(true);
    mkdirSync(data, { mode: 0o711 });
    expect(anybodyMayEnter(data)).toBe(true);
  });
  test("is no below one folder that is closed to others", () => {
    chmodSync(base, 0o750);
    expect(anybodyMayEnter(data)).toBe(false);
  });
});

describe("clusterPlace", () => {
  test("is the data folder itself where anybody may walk there, and makes nothing", () => {
    expect(clusterPlace(data, elsewhere)).toBe(data);
    expect(anybodyMayEnter(elsewhere)).toBe(true);
    expect(() => mkdirSync(data)).not.toThrow();
    expect(() => mkdirSync(elsewhere)).not.toThrow();
  });
  test("is elsewhere for root below a closed folder, always the same one", () => {
    chmodSync(base, 0o700);
    const place = clusterPlace(data, elsewhere);
    expect(path.dirname(place)).toBe(isRoot ? elsewhere : path.dirname(data));
    expect(clusterPlace(data, elsewhere)).toBe(place);
  });
  test("stays where the cluster was made, though folders open and close", () => {
    chmodSync(base, 0o700);
    const first = clusterPlace(data, elsewhere);
    mkdirSync(path.join(first, "cluster"), { recursive: true });
    chmodSync(base, 0o755);
    expect(clusterPlace(data, elsewhere)).toBe(first);

    const other = path.join(base, `other-${count}`);
    mkdirSync(path.join(other, "cluster"), { recursive: true });
    chmodSync(base, 0o700);
    expect(clusterPlace(other, elsewhere)).toBe(other);
  });
});
