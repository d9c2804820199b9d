"use client";

import { FormField, FormSelect } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";

interface Named {
  id: string;
  name: string;
}

/** Gives a tablet another name or, from now on, another cell. */
export function KioskChange({
  action,
  kiosk,
  cells,
}: {
  action: FormAction<unknown>;
  kiosk: Named & { cells: readonly Named[] };
  cells: readonly Named[];
}) {
  const sent = useAnswer(action);
  const now = kiosk.cells.map(({ name }) => name).join(" and ");
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="kiosk" value={kiosk.id} />
      <FormField sent={sent} name="name" label="Name" value={kiosk.name} required />
      <FormSelect
        sent={sent}
        name="cell"
        label="Cell from now on"
        hint="What was booked there before stays with the cell it was booked for."
        value=""
      >
        <option value="">as it is: {now}</option>
        {cells.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </FormSelect>
      <FormFoot sent={sent} submit="Keep the changes" done="Kept." />
    </form>
  );
}

/** Takes a tablet out of use. */
export function KioskRevocation({ action, kiosk }: { action: FormAction<unknown>; kiosk: string }) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="kiosk" value={kiosk} />
      <p>
        A lost or broken tablet books nothing from now on. What it still keeps from before can be
        handed in and looked at.
      </p>
      <FormFoot sent={sent} submit="Take it out of use" tone="danger" />
    </form>
  );
}
