import { describe, expect, test } from "vitest";
import { breachesOf, circlesIn, neededBy } from "@/tests/setup/directions";
import { sourceFiles } from "@/tests/setup/source";

const files = sourceFiles();

describe("import directions", () => {
  test("every layer is looked at", () => {
    for (const layer of ["lib", "db", "kiosk", "components", "app", "scripts", "tests"])
      expect(files.filter((file) => file.startsWith(`${layer}/`)).length, layer).toBeGreaterThan(2);
  });

  test("no file imports what its layer may not", () => {
    expect(files.flatMap((file) => breachesOf(file))).toEqual([]);
  });

  test("no two files need each other: they are one, or need a third", () => {
    expect(circlesIn(new Map(files.map((file) => [file, neededBy(file)])))).toEqual([]);
  });
});

describe("breachesOf", () => {
  test.each([
    ["lib/a.ts", 'import { wrap } from "@/db/client";', "lib/ may import lib only"],
    ["lib/a.ts", 'import type { Db } from "@/db/client";', "lib/ may import lib only"],
    ["lib/a.ts", 'import { useState } from "react";', "lib/ is pure"],
    ["lib/a.ts", 'import { readFileSync } from "node:fs";', "the browser too"],
    ["lib/a.ts", 'import { readFileSync } from "fs";', "the browser too"],
    ["lib/a.ts", 'import { eq } from "drizzle-orm/sql";', "only db/ speaks SQL"],
    ["lib/time/a.ts", 'import { split } from "@/lib/timeline/split";', "inside lib"],
    ["lib/codes/a.ts", 'import { role } from "@/lib/access/roles";', "codes alone"],
    [
      "db/a.ts",
      'import { database } from "@/app/_server/database";',
      "db/ may import lib, db only",
    ],
    ["db/a.ts", 'export { forbidden } from "next/navigation";', "drawing is for components/"],
    ["kiosk/a.ts", 'import { useState } from "react";', "only kiosk/use-*.ts"],
    ["kiosk/use-a.ts", 'import Link from "next/link";', "works without a server"],
    ["components/a.tsx", 'export * from "@/db/client";', "components/ may import"],
    ["components/a.tsx", 'const b = <i>{import("@/db/client")}</i>;', "components/ may import"],
    ["app/a.ts", 'import pg from "pg";', "only db/ speaks SQL"],
    ["app/a.ts", 'import { withDb } from "@/tests/setup/db";', "app/ may import"],
    ["app/a.ts", 'import { say } from "@/scripts/ground/connect";', "app/ may import"],
    ["scripts/a.ts", 'import { Icon } from "@/components/ui/icon";', "scripts/ may import"],
    ["lib/time/a.ts", 'import { assert } from "../assert";', "write it as @/lib/assert"],
  ])("%s may not: %s", (file, source, why) => {
    const breaches = breachesOf(file, source);
    expect(breaches).toHaveLength(1);
    expect(breaches[0]).toContain(why);
  });

  test.each([
    ["lib/a.ts", 'import { z } from "zod";'],
    ["kiosk/use-a.ts", 'import { useState } from "react";'],
    ["app/a.ts", 'import { wrap } from "@/db/client"; import { sum } from "./sum";'],
    ["scripts/a.ts", 'import { env } from "@/app/_server/env";'],
  ])("%s may: %s", (file, source) => {
    expect(breachesOf(file, source)).toEqual([]);
  });
});

describe("circlesIn", () => {
  test("finds the way round, wherever one enters it", () => {
    const needs = { start: ["a"], a: ["b"], b: ["c", "leaf"], c: ["a"], leaf: [] };
    expect(circlesIn(new Map(Object.entries(needs)))).toEqual([["a", "b", "c", "a"]]);
  });

  test("finds none where ways only meet", () => {
    const needs = { a: ["b", "c"], b: ["d"], c: ["d"], d: [] };
    expect(circlesIn(new Map(Object.entries(needs)))).toEqual([]);
  });
});
