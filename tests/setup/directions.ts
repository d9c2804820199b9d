import { isBuiltin } from "node:module";
import { fileOf, importsOf } from "@/tests/setup/source";

/** Which folders a layer may import. */
const layers: Record<string, readonly string[]> = {
  lib: ["lib"],
  db: ["lib", "db"],
  kiosk: ["lib", "kiosk"],
  components: ["lib", "kiosk", "components"],
  app: ["lib", "db", "kiosk", "components", "app"],
  scripts: ["lib", "db", "app/_server", "app/_jobs", "scripts"],
  tests: [
    "lib",
    "db",
    "kiosk",
    "components",
    "app",
    "scripts",
    "tests",
    "proxy",
    "instrumentation",
  ],
};

/** Which packages a layer may not touch, and what to do instead. */
const packages: Record<string, readonly (readonly [names: RegExp, instead: string])[]> = {
  lib: [
    [/^(react|react-dom|next|swr|idb|pino)$/, "lib/ is pure: pass in what it needs"],
    [/^(drizzle-orm|pg)/, "only db/ speaks SQL"],
    [/^node:/, "lib/ runs in the browser too: pass in what it needs"],
  ],
  db: [[/^(react|react-dom|next|swr)$/, "db/ answers with rows; drawing is for components/"]],
  kiosk: [
    [/^next$/, "the kiosk works without a server"],
    [/^(drizzle-orm|pg)/, "only db/ speaks SQL"],
    [/^node:/, "the browser has no node: modules"],
  ],
  components: [
    [/^(drizzle-orm|pg)/, "only db/ speaks SQL"],
    [/^node:/, "the browser has no node: modules"],
  ],
  app: [[/^(drizzle-orm|pg)/, "only db/ speaks SQL: add a query in db/<room>/"]],
  scripts: [[/^(drizzle-orm|pg)/, "only db/ speaks SQL: add a query in db/<room>/"]],
};

/** Inside lib: what a room may not know of, because it stands below it or alone. */
const rooms: readonly (readonly [from: RegExp, not: RegExp])[] = [
  [/^lib\/time\//, /^lib\/(timeline|standards|pay|seam|flow)\//],
  [/^lib\/timeline\//, /^lib\/(standards|pay|seam|flow)\//],
  [/^lib\/standards\//, /^lib\/(pay|seam|flow)\//],
  [/^lib\/study\//, /^lib\/(?!study\/)[a-z-]+\//],
  [/^lib\/codes\//, /^lib\/(?!codes\/)[a-z-]+\//],
];

/** Says what is wrong with the imports of a file, one sentence each; empty when all are allowed. */
export function breachesOf(file: string, source?: string): string[] {
  const layer = file.split("/")[0]!;
  return importsOf(file, source).flatMap(({ what }) => {
    const found = fileOf(file, what);
    const fault = found === null ? packageFault(file, layer, what) : fileFault(file, layer, found);
    const parent = what.startsWith("../") ? `write it as @/${found}` : null;
    return [fault, parent].filter((each) => each !== null).map((why) => `${file}: ${what}: ${why}`);
  });
}

function fileFault(file: string, layer: string, found: string): string | null {
  const allowed = layers[layer] ?? [];
  const isAllowed = allowed.some((each) => found === each || found.startsWith(`${each}/`));
  // what lies at the root of the project is set-up; a style sheet or picture is no layer's code
  const isCode = found.includes("/") && !/\.(css|svg|json)$/.test(found);
  if (isCode && !isAllowed) return `${layer}/ may import ${allowed.join(", ")} only`;
  const room = rooms.find(([from, not]) => from.test(file) && not.test(found));
  return room
    ? "inside lib: time, timeline, standards, then pay, seam, flow; study, codes alone"
    : null;
}

function packageFault(file: string, layer: string, what: string): string | null {
  const name = isBuiltin(what) ? `node:${what.replace(/^node:/, "")}` : packageName(what);
  if (layer === "kiosk" && /^(react|react-dom|swr)$/.test(name))
    return /\/use-[a-z-]+\.tsx?$/.test(file) ? null : "only kiosk/use-*.ts may know React";
  return packages[layer]?.find(([names]) => names.test(name))?.[1] ?? null;
}

function packageName(what: string): string {
  return what.startsWith("@") ? what.split("/").slice(0, 2).join("/") : what.split("/")[0]!;
}

/**
 * Finds the circles among files that need each other when the program runs, each as the path that
 * leads back to its first file. Types alone make no circle: they are gone by then.
 *
 * @param needs what each file imports, by file
 */
export function circlesIn(needs: ReadonlyMap<string, readonly string[]>): string[][] {
  const circles: string[][] = [];
  const done = new Set<string>();
  const visit = (file: string, way: readonly string[]): void => {
    const at = way.indexOf(file);
    if (at >= 0) circles.push([...way.slice(at), file]);
    if (at >= 0 || done.has(file)) return;
    for (const next of needs.get(file) ?? []) visit(next, [...way, file]);
    done.add(file);
  };
  for (const file of needs.keys()) visit(file, []);
  return circles;
}

/** Lists the files that a file needs when the program runs. */
export function neededBy(file: string): string[] {
  return importsOf(file).flatMap(({ what, isType }) => {
    const found = isType ? null : fileOf(file, what);
    return found ? [found] : [];
  });
}
