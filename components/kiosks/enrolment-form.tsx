"use client";

import { QrCode } from "@/components/print/qr-code";
import { FormField, FormSelect } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import type { GivenCode } from "@/lib/kiosks/office-schema";

/** Asks for a tablet's name and cell; in its place the code is shown, once. */
export function EnrolmentForm({
  action,
  id,
  cells,
}: {
  action: FormAction<GivenCode>;
  id: string;
  cells: readonly { id: string; name: string }[];
}) {
  const sent = useAnswer(action);
  if (sent.value) return <CodeShown given={sent.value} />;
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="id" value={id} />
      <FormField
        sent={sent}
        name="name"
        label="Name of the tablet"
        hint="Such as the bench or wall where it hangs."
        required
      />
      <FormSelect sent={sent} name="cell" label="Cell">
        {cells.map(({ id: cell, name }) => (
          <option key={cell} value={cell}>
            {name}
          </option>
        ))}
      </FormSelect>
      <FormFoot sent={sent} submit="Make a code" />
    </form>
  );
}

function CodeShown({ given }: { given: GivenCode }) {
  return (
    <div role="status" className="desk-once">
      <p>
        Code for {given.name}, cell {given.cell}
      </p>
      <p className="desk-secret">
        <code>{given.code}</code>
      </p>
      <p>
        It holds until {given.until}, once. Key it at{" "}
        <code className="break-all whitespace-normal">{given.address}</code>, or scan this there:
      </p>
      <QrCode
        dots={given.dots}
        label={`QR code that opens ${given.address} with the code`}
        className="w-48"
      />
    </div>
  );
}
