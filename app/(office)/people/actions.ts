"use server";

import { act } from "@/app/_server/act";
import { hashPassword } from "@/app/_server/password";
import { drawSecret } from "@/app/_server/secret";
import { addWorker, changeWorker, setPin } from "@/db/people/commands";
import { findWorker } from "@/db/people/queries";
import { drawPin } from "@/lib/people/pin";
import { type GivenPin, pinForm, workerForm } from "@/lib/people/schema";
import { no, ok } from "@/lib/result";

/** Adds a worker; the answer shows the first PIN, once. */
export const addPerson = act(
  { may: "people.change", form: workerForm },
  async ({ scope, input, by }) => {
    const pin = drawPin(drawSecret, input.number);
    const added = await addWorker(scope, input, {
      hash: await hashPassword(pin),
      at: new Date(),
      by,
    });
    if (!added.ok) return added;
    return ok<GivenPin>({ number: input.number, name: input.name, pin });
  },
);

/** Changes name, number, cell, language, payroll number or last day. */
export const changePerson = act(
  { may: "people.change", form: workerForm },
  async ({ scope, input, by }) => changeWorker(scope, input, by),
);

/** Gives a worker a new PIN; a lead's reach is the own cells. The answer shows it, once. */
export const resetPin = act(
  { may: "people.reset-pin", form: pinForm },
  async ({ scope, cells, input, by }) => {
    const worker = await findWorker(scope, input.worker, cells);
    if (!worker) return no("notFound", `${input.worker} is not one of your people.`);
    const pin = drawPin(drawSecret, worker.number);
    await setPin(scope, worker.id, { hash: await hashPassword(pin), at: new Date(), by });
    return ok<GivenPin>({ number: worker.number, name: worker.name, pin });
  },
);
