"use client";

import { PinShown } from "@/components/people/pin-shown";
import { FormField, FormSelect } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, type Sent, useAnswer } from "@/components/shell/use-answer";
import type { GivenPin } from "@/lib/people/schema";

/** A worker as the form shows one: what is on file, or a new one's first values. */
interface WorkerOnFile {
  id: string;
  number: string;
  name: string;
  cellId: string;
  language: string;
  payrollNumber: string | null;
  endsOn: string | null;
}

interface WorkerFormProps<V> {
  action: FormAction<V>;
  worker: WorkerOnFile;
  cells: readonly { id: string; name: string }[];
}

/** Adds a worker; in its place the first PIN is shown, once. */
export function NewWorker({ action, worker, cells }: WorkerFormProps<GivenPin>) {
  const sent = useAnswer(action);
  if (sent.value) return <PinShown given={sent.value} />;
  return (
    <form action={sent.send} className="desk-form">
      <WorkerFields sent={sent} worker={worker} cells={cells} />
      <FormFoot sent={sent} submit="Add and show the PIN" />
    </form>
  );
}

/** Changes what is kept of a worker. */
export function WorkerChange({ action, worker, cells }: WorkerFormProps<unknown>) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="desk-form">
      <WorkerFields sent={sent} worker={worker} cells={cells} />
      <FormFoot sent={sent} submit="Keep the changes" done="Kept." />
    </form>
  );
}

function WorkerFields({
  sent,
  worker,
  cells,
}: {
  sent: Sent<unknown>;
  worker: WorkerOnFile;
  cells: readonly { id: string; name: string }[];
}) {
  return (
    <>
      <input type="hidden" name="id" value={worker.id} />
      <FormField
        sent={sent}
        name="number"
        label="Number"
        inputMode="numeric"
        value={worker.number}
        required
      />
      <FormField sent={sent} name="name" label="Name" value={worker.name} required />
      <FormSelect sent={sent} name="cell" label="Home cell" value={worker.cellId}>
        {cells.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </FormSelect>
      <FormSelect sent={sent} name="language" label="Language at the kiosk" value={worker.language}>
        <option value="en">English</option>
        <option value="es">Español</option>
      </FormSelect>
      <FormField
        sent={sent}
        name="payrollNumber"
        label="Payroll number"
        hint="Leave empty if payroll has none yet."
        value={worker.payrollNumber ?? ""}
      />
      <FormField
        sent={sent}
        name="endsOn"
        label="Last day here"
        type="date"
        hint="Leave empty while the person stays."
        value={worker.endsOn ?? ""}
      />
    </>
  );
}
