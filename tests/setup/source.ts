import { existsSync, readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { type Module, parseSync } from "@swc/core";

const root = process.cwd();
/** The layers of the product, then what drives and tests it. */
const FOLDERS = ["lib", "db", "kiosk", "components", "app", "scripts", "tests"];

/** Lists the source files of a folder of the project, or of all of them, as paths from its root. */
export function sourceFiles(folders: readonly string[] = FOLDERS): string[] {
  return folders
    .filter((folder) => existsSync(path.join(root, folder)))
    .flatMap((folder) =>
      readdirSync(path.join(root, folder), { recursive: true, encoding: "utf8" }).map((name) =>
        path.posix.join(folder, name),
      ),
    )
    .filter((name) => /\.(ts|tsx|mjs)$/.test(name))
    .sort();
}

/** Reads a file of the project. */
export function read(file: string): string {
  return readFileSync(path.join(root, file), "utf8");
}

export function parse(file: string, source = read(file)): Module {
  const isTypeScript = /\.tsx?$/.test(file);
  return isTypeScript
    ? parseSync(source, { syntax: "typescript", tsx: file.endsWith("x"), target: "es2022" })
    : parseSync(source, { syntax: "ecmascript", target: "es2022" });
}

/** One import or re-export of a file; `isType` where nothing of it is left when the program runs. */
export interface Import {
  what: string;
  isType: boolean;
}

/** Lists what a file imports: statements, re-exports, and `import()` of a fixed name. */
export function importsOf(file: string, source = read(file)): Import[] {
  const imports: Import[] = [];
  for (const item of parse(file, source).body) {
    if (item.type === "ImportDeclaration") {
      const parts = item.specifiers;
      const allTypes =
        parts.length > 0 && parts.every((part) => "isTypeOnly" in part && part.isTypeOnly);
      imports.push({ what: item.source.value, isType: item.typeOnly || allTypes });
    }
    if (item.type === "ExportAllDeclaration")
      imports.push({ what: item.source.value, isType: false });
    // safe because swc gives every re-export its `typeOnly`, which its types leave out
    if (item.type === "ExportNamedDeclaration" && item.source)
      imports.push({
        what: item.source.value,
        isType: (item as { typeOnly?: boolean }).typeOnly === true,
      });
  }
  for (const [, what] of source.matchAll(/\bimport\(\s*["']([^"']+)["']\s*\)/g))
    imports.push({ what: what!, isType: false });
  return imports;
}

/** Lists the names of the functions and classes that a file exports, arrow functions too. */
export function exportedFunctions(file: string, source = read(file)): string[] {
  return parse(file, source).body.flatMap((item) => {
    if (item.type !== "ExportDeclaration") return [];
    const made = item.declaration;
    if (made.type === "FunctionDeclaration" || made.type === "ClassDeclaration")
      return [made.identifier.value];
    if (made.type !== "VariableDeclaration") return [];
    return made.declarations
      .filter(({ init }) => /^(Arrow)?FunctionExpression$/.test(init?.type ?? ""))
      .flatMap(({ id }) => (id.type === "Identifier" ? [id.value] : []));
  });
}

/** Finds the file that an import names; null for a package. */
export function fileOf(importer: string, what: string): string | null {
  if (!/^(@\/|\.)/.test(what)) return null;
  const wanted = what.startsWith("@/")
    ? what.slice(2)
    : path.posix.join(path.posix.dirname(importer), what);
  const names = [wanted, `${wanted}.ts`, `${wanted}.tsx`, `${wanted}.mjs`, `${wanted}/index.ts`];
  return names.find((name) => /\.\w+$/.test(name) && existsSync(path.join(root, name))) ?? wanted;
}
