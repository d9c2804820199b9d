"use server";

import { act } from "@/app/_server/act";
import { ownAddress } from "@/app/_server/own-address";
import { dotsOf } from "@/app/_server/print";
import { drawSecret, hashSecret } from "@/app/_server/secret";
import { siteOf } from "@/app/_server/site";
import { listCells } from "@/db/cells/queries";
import { changeKiosk as changeKioskRow, revokeKiosk as revokeKioskRow } from "@/db/kiosks/commands";
import { addEnrolmentCode } from "@/db/kiosks/enrolment";
import { drawEnrolmentCode, shownEnrolmentCode } from "@/lib/access/issue";
import { enrolmentForm, type GivenCode, kioskChoice, kioskForm } from "@/lib/kiosks/office-schema";
import { noField, ok } from "@/lib/result";
import { clockText } from "@/lib/time/format";
import { ruleAt } from "@/lib/time/site-day";

/** Makes a one-time code with which a browser becomes a kiosk of a cell; shown once. */
export const makeCode = act(
  { may: "kiosks.change", form: enrolmentForm },
  async ({ scope, input, by }) => {
    const { id, name, cell: cellId } = input;
    const cell = (await listCells(scope)).find((each) => each.id === cellId);
    if (!cell) return noField("cell", "This cell is not here any more. Choose another.");
    const code = drawEnrolmentCode(drawSecret);
    const wanted = { id, name, cellId, codeHash: hashSecret(code), by, now: new Date() };
    const expiresAt = await addEnrolmentCode(scope, wanted);
    const { rules } = await siteOf(scope.siteId);
    const { timeZone } = ruleAt(rules, expiresAt.getTime());
    const address = `${await ownAddress()}/kiosk/enrol`;
    return ok<GivenCode>({
      name,
      cell: cell.name,
      code: shownEnrolmentCode(code),
      address,
      dots: dotsOf(`${address}?code=${code}`),
      until: clockText(expiresAt.getTime(), timeZone),
    });
  },
);

/** Gives a kiosk another name or, from now on, another cell. */
export const changeKiosk = act(
  { may: "kiosks.change", form: kioskForm },
  async ({ scope, input, by }) => {
    const { kiosk: id, name, cell: cellId } = input;
    if (cellId && !(await listCells(scope)).some((cell) => cell.id === cellId)) {
      return noField("cell", "This cell is not here any more. Choose another.");
    }
    return changeKioskRow(scope, { id, name, cellId }, { by, now: new Date() });
  },
);

/** Takes a kiosk out of use. */
export const revokeKiosk = act(
  { may: "kiosks.change", form: kioskChoice },
  async ({ scope, input, by }) => revokeKioskRow(scope, input.kiosk, { by, now: new Date() }),
);
