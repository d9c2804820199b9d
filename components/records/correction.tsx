"use client";

import Link from "next/link";
import { type ReactNode, useEffect, useState } from "react";
import { v7 as uuidv7 } from "uuid";
import { FormField } from "@/components/shell/form-field";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { Dialog } from "@/components/ui/dialog";

interface CorrectionProps {
  action: FormAction<void>;
  /** What is corrected, as the dialog's title. */
  title: string;
  /** What the form sends besides time and reason. */
  fields: Record<string, string>;
  timeLabel: string;
  /** What the field for the time begins with. */
  proposed: string;
  /** The possible deeds: what each sends as `deed`, and what its button says. */
  deeds: readonly { deed: string; label: string; tone?: "danger" }[];
  /** Where the rest of it can be looked at. */
  more?: { href: string; label: string };
}

/**
 * A button that opens a question across the seam: when, why, and what to do about somebody's time.
 * The form is new each time it opens, so that it is never sent twice for two things.
 */
export function Correction({
  children,
  label,
  ...correction
}: CorrectionProps & { children: ReactNode; label: string }) {
  const [formId, setFormId] = useState<string | null>(null);
  return (
    <>
      <button
        type="button"
        className="record-opener"
        aria-label={label}
        onClick={() => setFormId(uuidv7())}
      >
        {children}
      </button>
      <Dialog open={formId !== null} title={correction.title} onClose={() => setFormId(null)}>
        {formId && (
          <CorrectionForm {...correction} formId={formId} onDone={() => setFormId(null)} />
        )}
      </Dialog>
    </>
  );
}

function CorrectionForm({
  action,
  fields,
  timeLabel,
  proposed,
  deeds,
  more,
  formId,
  onDone,
}: CorrectionProps & { formId: string; onDone: () => void }) {
  const sent = useAnswer(action);
  const { isDone } = sent;
  useEffect(() => {
    if (isDone) onDone();
  }, [isDone, onDone]);
  return (
    <form action={sent.send} className="record-form">
      {Object.entries({ ...fields, id: formId }).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <FormField
        sent={sent}
        name="time"
        label={timeLabel}
        type="datetime-local"
        step={1}
        value={proposed}
      />
      <FormField
        sent={sent}
        name="reason"
        label="Reason"
        hint="Whoever's time it is reads it too."
        maxLength={300}
        required
      />
      <div className="record-ways">
        {deeds.map(({ deed, label, tone = "solid" }) => (
          <button
            key={deed}
            type="submit"
            name="deed"
            value={deed}
            className="button"
            data-tone={tone}
            disabled={sent.isSending}
          >
            {label}
          </button>
        ))}
        <button type="button" className="button" data-rim="right" onClick={onDone}>
          Leave it
        </button>
      </div>
      {more && <Link href={more.href}>{more.label}</Link>}
      <p role="status" className="font-[650] text-danger">
        {sent.problem?.errors ? "Look at what is marked." : sent.problem?.detail}
      </p>
    </form>
  );
}
