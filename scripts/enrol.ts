import { randomInt } from "node:crypto";
import { parseArgs } from "node:util";
import { hashSecret } from "@/app/_server/secret";
import { listCells } from "@/db/cells/queries";
import type { Scope } from "@/db/client";
import { addEnrolmentCode, findCellNamed } from "@/db/kiosks/enrolment";
import { drawEnrolmentCode, shownEnrolmentCode } from "@/lib/access/issue";
import { command, Refusal, say, withSite } from "./ground/connect";

/** `npm run enrol -- --cell Assembly [--name "Assembly 2"]`: prints a code for a new kiosk. */
await command(() =>
  withSite(async (scope) => {
    const options = { cell: { type: "string" }, name: { type: "string" } } as const;
    const { values } = parseArgs({ options });
    const cell = values.cell === undefined ? null : await findCellNamed(scope, values.cell);
    if (!cell) throw new Refusal(await knownCells(scope, values.cell));
    const code = drawEnrolmentCode((below) => randomInt(below));
    const name = values.name ?? cell.name;
    const wanted = { codeHash: hashSecret(code), name, cellId: cell.id, by: "command:enrol" };
    const expiresAt = await addEnrolmentCode(scope, { ...wanted, now: new Date() });
    process.stdout.write(`${shownEnrolmentCode(code)}\nuntil ${expiresAt.toISOString()}\n`);
    say(`Key it at /kiosk/enrol; it works once, for a tablet of ${cell.name}.`);
  }),
);

async function knownCells(scope: Scope, asked: string | undefined): Promise<string> {
  const names = (await listCells(scope)).map(({ name }) => name);
  const wanted = asked === undefined ? "Say for which cell" : `There is no cell "${asked}" here`;
  const known = names.length > 0 ? `The cells are: ${names.join(", ")}.` : "None is made yet.";
  return `${wanted}: npm run enrol -- --cell NAME\n${known}`;
}
