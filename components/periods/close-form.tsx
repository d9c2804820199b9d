"use client";

import { FormField } from "@/components/shell/form-field";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";

/** Closes a period; what is still open is closed by name, with the reason, or not at all. */
export function CloseForm({
  action,
  period,
  open,
}: {
  action: FormAction<unknown>;
  period: string;
  /** Who is still to be looked at. */
  open: readonly { id: string; name: string; why: string }[];
}) {
  const sent = useAnswer(action);
  const ticked = sent.typedList("named") ?? [];
  return (
    <form action={sent.send} className="period-form">
      <input type="hidden" name="period" value={period} />
      {open.length > 0 && (
        <fieldset>
          <legend>Close by name, though something is open: all tapped time is paid</legend>
          <div className="period-names">
            {open.map(({ id, name, why }) => (
              <label key={id}>
                <input
                  type="checkbox"
                  name="named[]"
                  value={id}
                  defaultChecked={ticked.includes(id)}
                />{" "}
                {name} <span className="text-ink-2">{why}</span>
              </label>
            ))}
          </div>
        </fieldset>
      )}
      {open.length > 0 ? (
        <FormField
          sent={sent}
          name="reason"
          label="Why it is closed all the same"
          hint="It stands beside the file. What is settled later is paid as an adjustment."
        />
      ) : (
        <input type="hidden" name="reason" value="" />
      )}
      <FormFoot sent={sent} submit="Close the period" done="Closed." />
    </form>
  );
}

/** Takes a closing back; its rows and files stay. */
export function ReopenForm({ action, period }: { action: FormAction<unknown>; period: string }) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="period-form">
      <input type="hidden" name="period" value={period} />
      <FormField
        sent={sent}
        name="reason"
        label="Why it is opened again"
        hint="The file as it is stays; the next closing makes another. A correction needs no reopening."
        required
      />
      <FormFoot sent={sent} submit="Open it again" />
    </form>
  );
}
