"use client";

import { FormField } from "@/components/shell/form-field";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import type { OwnEnd } from "@/lib/me/own-week";

/** Asks when one left, on a day whose end nobody tapped. */
export function LeftForm({
  action,
  formId,
  end: { subject, day, lastTap, proposed },
}: {
  action: FormAction<void>;
  formId: string;
  end: OwnEnd;
}) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="me-ask">
      <h2>When did you leave on {day}?</h2>
      <p>No end was tapped. Your last tap was at {lastTap}.</p>
      <input type="hidden" name="id" value={formId} />
      <input type="hidden" name="subject" value={subject} />
      <FormField sent={sent} name="time" label="I left at" type="datetime-local" value={proposed} />
      <button type="submit" className="button" data-rim="both" disabled={sent.isSending}>
        That is when I left
      </button>
      <p role="status" className="font-[650] text-danger">
        {sent.problem?.errors ? "Look at what is marked." : sent.problem?.detail}
      </p>
    </form>
  );
}
