"use client";

import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { spelledDay } from "@/lib/agreement/schema";
import type { MeDay } from "@/lib/me/view";

/** One's own agreement to the days that are over and not agreed to yet; none left: nothing. */
export function AgreeForm({
  action,
  formId,
  worker,
  days,
}: {
  action: FormAction<void>;
  formId: string;
  worker: string;
  days: readonly MeDay[];
}) {
  const sent = useAnswer(action);
  const open = days.flatMap(({ date, label, digest, isSigned }) =>
    digest === null || isSigned ? [] : [{ label, day: spelledDay({ worker, date, digest }) }],
  );
  const [first, last] = [open[0], open.at(-1)];
  if (!first || !last) return null;
  return (
    <form action={sent.send} className="me-agree">
      <input type="hidden" name="id" value={formId} />
      {open.map(({ day }) => (
        <input key={day} type="hidden" name="days[]" value={day} />
      ))}
      <button
        type="submit"
        className="button"
        data-tone="solid"
        data-rim="both"
        disabled={sent.isSending}
      >
        {first === last ? `${first.label} is right` : `${first.label} to ${last.label} are right`}
      </button>
      <p role="status" className="font-[650] text-danger">
        {sent.problem?.detail}
      </p>
    </form>
  );
}
