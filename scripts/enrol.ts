import { randomInt } from "node:crypto";
import { hashSecret } from "@/app/_server/secret";
import { listCells } from "@/db/cells/queries";
import { addEnrolmentCode } from "@/db/kiosks/enrolment";
import { drawEnrolmentCode, shownEnrolmentCode } from "@/lib/access/issue";
import { command, Refusal, readOptions, say, withSite } from "./ground/connect";

const USAGE = "npm run enrol -- --cell NAME";

/** `npm run enrol -- --cell Assembly [--name "Assembly 2"]`: prints a code for a new kiosk. */
await command(() =>
  withSite(async (scope) => {
    const values = readOptions({ cell: { type: "string" }, name: { type: "string" } }, USAGE);
    const cells = await listCells(scope);
    const cell = cellNamed(cells, values.cell ?? "");
    if (!cell) throw new Refusal(knownCells(cells, values.cell));
    const code = drawEnrolmentCode((below) => randomInt(below));
    const name = values.name ?? cell.name;
    const wanted = { codeHash: hashSecret(code), name, cellId: cell.id, by: "command:enrol" };
    const expiresAt = await addEnrolmentCode(scope, { ...wanted, now: new Date() });
    process.stdout.write(`${shownEnrolmentCode(code)}\nuntil ${expiresAt.toISOString()}\n`);
    say(`Key it at /kiosk/enrol; it works once, for a tablet of ${cell.name}.`);
  }),
);

/** As it is written, else whatever its capitals. */
function cellNamed<T extends { name: string }>(cells: readonly T[], asked: string): T | undefined {
  const [wanted, small] = [asked.trim(), asked.trim().toLowerCase()];
  const exact = cells.find(({ name }) => name === wanted);
  return exact ?? cells.find(({ name }) => name.toLowerCase() === small);
}

function knownCells(cells: readonly { name: string }[], asked: string | undefined): string {
  const names = cells.map(({ name }) => name);
  const wanted = asked === undefined ? "Say for which cell" : `There is no cell "${asked}" here`;
  const known = names.length > 0 ? `The cells are: ${names.join(", ")}.` : "None is made yet.";
  return `${wanted}: ${USAGE}\n${known}`;
}
