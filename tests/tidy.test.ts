import { existsSync, readdirSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { permissions } from "@/lib/access/may";
import { exportedFunctions, read, sourceFiles } from "@/tests/setup/source";
import { datesInSql, undocumented, unguarded } from "@/tests/setup/tidy";

const layers = ["lib", "db", "kiosk", "components"];
const files = sourceFiles();

/** Lists `file: what to do` for every file that `fault` finds something in. */
function faults(among: readonly string[], fault: (file: string) => readonly string[]): string[] {
  return among.flatMap((file) => fault(file).map((what) => `${file}: ${what}`));
}

describe("the house", () => {
  test("every rule in lib/ has its test in the same place under tests/lib/", () => {
    const rules = sourceFiles(["lib"]).filter((file) => exportedFunctions(file).length > 0);
    const mirror = (file: string) => `tests/${file.replace(/\.ts$/, ".test.ts")}`;
    const bare = rules.filter((file) => ![mirror(file), `${mirror(file)}x`].some(existsSync));
    expect(faults(bare, (file) => [`write ${mirror(file)}`])).toEqual([]);
  });

  test("every exported function of lib, db, kiosk and components says what it answers", () => {
    expect(faults(sourceFiles(layers), (file) => undocumented(file))).toEqual([]);
  });

  test("SQL never turns an instant into a date: lib/time decides days", () => {
    const migrations = readdirSync("db/migrations").filter((name) => name.endsWith(".sql"));
    const sql = [...migrations.map((name) => `db/migrations/${name}`), ...sourceFiles(["db"])];
    expect(faults(sql, (file) => datesInSql(read(file)))).toEqual([]);
  });

  test("every page, form and route names its action of lib/access", () => {
    expect(faults(sourceFiles(["app"]), (file) => unguarded(file))).toEqual([]);
  });

  test("file names say what is in them", () => {
    const forbidden = /(^|\/)(utils?|helpers?|misc|common|types|index|manager|service|data)\.\w+$/;
    const named = files.filter((file) => forbidden.test(file));
    expect(faults(named, () => ["name it after what it does"])).toEqual([]);
  });

  test("the environment is read in one place of the product", () => {
    const readers = sourceFiles([...layers, "app"]).filter((file) =>
      /\bprocess\.env\b/.test(read(file)),
    );
    expect(readers.filter((file) => file !== "app/_server/env.ts")).toEqual([]);
  });

  test("no test is left out or left alone", () => {
    const switched = /\b(test|it|describe)\.(skip|only|todo|fixme)\b|\bx(it|test|describe)\(/;
    const tests = sourceFiles(["tests"]).filter((file) => file !== "tests/tidy.test.ts");
    expect(tests.filter((file) => switched.test(read(file)))).toEqual([]);
  });

  test("nothing is left to do later in the text", () => {
    const later = /\b(TODO|FIXME|XXX|HACK)\b/;
    const texts = files.filter((file) => file !== "tests/tidy.test.ts");
    expect(texts.filter((file) => later.test(read(file)))).toEqual([]);
  });

  test("every migration says the oldest code that its schema serves", () => {
    const names = readdirSync("db/migrations").filter((name) => name.endsWith(".sql"));
    const first = (name: string) => read(`db/migrations/${name}`).split("\n")[0]!;
    const silent = names.filter((name) => {
      const served = /^-- Oldest code served: (\S+)$/.exec(first(name))?.[1];
      return !served || !names.includes(`${served}.sql`);
    });
    expect(silent).toEqual([]);
  });
});

describe("undocumented", () => {
  test.each([
    ["export function a() {}", 1],
    ["/** Says a. */\nexport function a() {}", 0],
    ["/** Says b. */\nconst b = 1;\nexport const a = () => b;", 1],
    ["/**\n * Says a.\n */\nexport async function a() {}", 0],
    ["// says a\nexport const a = () => 1;", 1],
    ["/** For `a`. */\nexport function a(b: string): void;\nexport function a() {}", 0],
    ["export const NUMBER = 1;\nfunction own() {}", 0],
  ])("%j has %i", (source, count) => {
    expect(undocumented("lib/a.ts", source)).toHaveLength(count);
  });
});

describe("datesInSql", () => {
  test.each([
    "select at::date from a",
    "select at at time zone 'UTC'",
    "where worked_on = current_date",
    "date_trunc('day', at)",
    "select date(at)",
    "cast(at as date)",
    "to_char(at, 'YYYY-MM-DD')",
  ])("finds %s", (sql) => {
    expect(datesInSql(`sql\`${sql}\``)).toHaveLength(1);
  });

  test.each(["at timestamptz not null", "work_on date not null", "date_trunc('month', at)"])(
    "leaves %s",
    (sql) => expect(datesInSql(sql)).toEqual([]),
  );
});

describe("unguarded", () => {
  const action = Object.keys(permissions)[0]!;
  test.each([
    ["app/api/a/route.ts", "export async function GET() {}", 1],
    ["app/api/a/route.ts", 'export const GET = handle({ actor: "person" }, run);', 1],
    ["app/api/a/route.ts", 'export const GET = handle({ actor: "key", may: "no.such" }, run);', 1],
    [
      "app/api/a/route.ts",
      `export const GET = handle({ actor: "key", may: "${action}" }, run);`,
      0,
    ],
    ["app/api/a/route.ts", 'export const GET = handle({ actor: "kiosk" }, run);', 0],
    ["app/(office)/a/page.tsx", "export default function Page() {}", 1],
    ["app/(office)/a/page.tsx", `await personFor("${action}")`, 0],
    ["app/(office)/a/actions.ts", `export const b = act({ may: "${action}", form }, run);`, 0],
    ["app/(office)/a/actions.ts", "export async function b() {}", 1],
    ["app/kiosk/page.tsx", "export default function Page() {}", 0],
  ])("%s: %s", (file, source, count) => {
    expect(unguarded(file, source)).toHaveLength(count);
  });
});
