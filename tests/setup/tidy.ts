import { permissions } from "@/lib/access/may";
import { exportedFunctions, parse, read } from "@/tests/setup/source";

/** Lists the exported functions of a file without a docstring right above them. */
export function undocumented(file: string, source = read(file)): string[] {
  const lines = source.split("\n");
  return exportedFunctions(file, source)
    .filter((name) => {
      const starts = new RegExp(`^export (async )?(function\\*?|const|class) ${name}\\b`);
      const line = lines.findIndex((text) => starts.test(text));
      return !lines[line - 1]?.trimEnd().endsWith("*/");
    })
    .map((name) => `say above ${name} what it answers, in /** */`);
}

/** Ways in which SQL makes a day of an instant; a month for a partition is no day. */
const DATES = [
  /\bat\s+time\s+zone\b/i,
  /\b(current_date|localtimestamp|localtime)\b/i,
  /::\s*date\b/i,
  /\bcast\s*\([^)]*\bas\s+date\s*\)/i,
  /\bdate_trunc\s*\(\s*'(day|week)/i,
  /\b(to_date|make_date)\s*\(/i,
  /\bto_char\s*\([^)]*DD/,
  /(?<![\w.])date\s*\(\s*[a-z_]*_?at\b/,
];

/** Lists where a text of SQL decides a day, line by line; a comment may speak of it. */
export function datesInSql(text: string): string[] {
  return text.split("\n").flatMap((line, at) => {
    const isComment = /^\s*(--|\/\/|\*|\/\*)/.test(line);
    const found = !isComment && DATES.some((pattern) => pattern.test(line));
    return found ? [`line ${at + 1} decides a day: ask lib/time, pass bounds in`] : [];
  });
}

const METHODS = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"];
/** The actors whose proof is a device or a token, not a role: they need no action. */
const ROLELESS = ["nobody", "kiosk", "worker"];
/** Pages that nobody need be signed in for: to sign in, and the static shells of the kiosk. */
const OPEN_PAGES = /^app\/(sign-in|kiosk)\//;

/** Lists what of a page, a form's actions or a route lets anyone in without naming an action. */
export function unguarded(file: string, source = read(file)): string[] {
  if (file.endsWith("/route.ts")) return unguardedRoutes(file, source);
  if (OPEN_PAGES.test(file) || file === "app/page.tsx") return [];
  const actions = [...source.matchAll(/\b(?:personFor\(|may:)\s*"([^"]+)"/g)].map(
    ([, name]) => name!,
  );
  const unknown = actions.filter((name) => !(name in permissions));
  if (unknown.length > 0) return unknown.map((name) => `lib/access/may.ts has no action ${name}`);
  if (/\/page\.tsx$/.test(file) && actions.length === 0)
    return ['begin with await personFor("…"), which names the action'];
  if (/\/actions\.ts$/.test(file)) return exportsNotMadeBy(/^\s*=\s*(act|openAct)\b/, file, source);
  return [];
}

function unguardedRoutes(file: string, source: string): string[] {
  const bare = exportsNotMadeBy(/^\s*=\s*handle\(/, file, source);
  const entrances = [...source.matchAll(/\bhandle\(\s*\{([^}]*)/g)].map(([, head]) => head!);
  const open = entrances.flatMap((head) => {
    const actor = /\bactor:\s*"(\w+)"/.exec(head)?.[1] ?? "";
    const action = /\bmay:\s*"([^"]+)"/.exec(head)?.[1];
    if (action && !(action in permissions)) return [`lib/access/may.ts has no action ${action}`];
    return action || ROLELESS.includes(actor)
      ? []
      : [`handle({ actor: "${actor}" }) needs \`may\``];
  });
  return [...bare, ...open];
}

/** Names the exports that are entrances and are not made by the one wrapper for them. */
function exportsNotMadeBy(wrapper: RegExp, file: string, source: string): string[] {
  const isRoute = file.endsWith("/route.ts");
  const names = parse(file, source).body.flatMap((item) => {
    if (item.type !== "ExportDeclaration") return [];
    const made = item.declaration;
    if (made.type === "FunctionDeclaration") return [made.identifier.value];
    if (made.type !== "VariableDeclaration") return [];
    return made.declarations.flatMap(({ id }) => (id.type === "Identifier" ? [id.value] : []));
  });
  return names
    .filter((name) => !isRoute || METHODS.includes(name))
    .filter((name) => {
      const after = source.split(new RegExp(`export const ${name}\\b[^=]*(?==)`))[1] ?? "";
      return !wrapper.test(after);
    })
    .map((name) => `${name} must be made by ${isRoute ? "handle()" : "act() or openAct()"}`);
}
