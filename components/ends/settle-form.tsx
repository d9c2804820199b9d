"use client";

import { FormField } from "@/components/shell/form-field";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import type { Way } from "@/lib/ends/ways";

/**
 * Settles a loose end: the reason once, then one of the ways. A way that asks for a time or a worker
 * has its field beside it.
 */
export function SettleForm({
  action,
  end,
  ways,
  proposed,
}: {
  action: FormAction<void>;
  end: { id: string; code: string; subject: string };
  ways: readonly Way[];
  /** What the field for a time begins with. */
  proposed: string;
}) {
  const sent = useAnswer(action);
  const asks = (what: Way["asks"]) => ways.some((way) => way.asks === what);
  return (
    <form action={sent.send} className="ends-form">
      {Object.entries(end).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <FormField sent={sent} name="reason" label="Reason" maxLength={300} required />
      <div className="record-ways">
        {ways
          .filter((way) => !way.asks)
          .map((way) => (
            <WayButton key={way.answer} way={way} isSending={sent.isSending} />
          ))}
      </div>
      {asks("time") && (
        <div className="record-ways">
          <FormField
            sent={sent}
            name="time"
            label="Another time"
            type="datetime-local"
            value={proposed}
          />
          {ways
            .filter((way) => way.asks === "time")
            .map((way) => (
              <WayButton key={way.answer} way={way} isSending={sent.isSending} />
            ))}
        </div>
      )}
      {asks("worker") && (
        <div className="record-ways">
          <FormField sent={sent} name="worker" label="Worker's number" inputMode="numeric" />
          {ways
            .filter((way) => way.asks === "worker")
            .map((way) => (
              <WayButton key={way.answer} way={way} isSending={sent.isSending} />
            ))}
        </div>
      )}
      <p role="status" className="font-[650] text-danger">
        {sent.problem?.errors ? "Look at what is marked." : sent.problem?.detail}
      </p>
    </form>
  );
}

function WayButton({ way, isSending }: { way: Way; isSending: boolean }) {
  return (
    <button type="submit" name="answer" value={way.answer} className="button" disabled={isSending}>
      {way.label}
    </button>
  );
}
