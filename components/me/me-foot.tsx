"use client";

import Link from "next/link";
import { type ReactNode, useEffect, useState } from "react";
import { v7 as uuidv7 } from "uuid";
import { FormSelect } from "@/components/shell/form-field";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { Dialog } from "@/components/ui/dialog";
import { TextField } from "@/components/ui/field";
import { Icon } from "@/components/ui/icon";
import type { MeDay } from "@/lib/me/view";

/** The two acts of the page across its seam, and signing out. */
export function MeFoot({
  action,
  days,
  signOut,
}: {
  action: FormAction<void>;
  days: readonly MeDay[];
  signOut: ReactNode;
}) {
  const [formId, setFormId] = useState<string | null>(null);
  const [isSent, setSent] = useState(false);
  return (
    <footer className="me-foot">
      <button
        type="button"
        className="plate"
        data-rim="left"
        data-minor=""
        onClick={() => setFormId(uuidv7())}
      >
        <Icon name="message" />
        <span>Something is wrong</span>
      </button>
      <Link href="/me/badge" className="plate" data-rim="right" data-minor="">
        <Icon name="badge" />
        <span>Show my badge</span>
      </Link>
      <p role="status" className="me-said">
        {isSent && "Your lead will look at it."}
      </p>
      <div className="me-out">{signOut}</div>
      <Dialog open={formId !== null} title="What is wrong?" onClose={() => setFormId(null)}>
        {formId && (
          <ObjectForm
            action={action}
            formId={formId}
            days={days}
            onDone={() => {
              setSent(true);
              setFormId(null);
            }}
          />
        )}
      </Dialog>
    </footer>
  );
}

function ObjectForm({
  action,
  formId,
  days,
  onDone,
}: {
  action: FormAction<void>;
  formId: string;
  days: readonly MeDay[];
  onDone: () => void;
}) {
  const sent = useAnswer(action);
  const { isDone } = sent;
  useEffect(() => {
    if (isDone) onDone();
  }, [isDone, onDone]);
  const today = days.find(({ isToday }) => isToday) ?? days[0];
  return (
    <form action={sent.send} className="record-form">
      <input type="hidden" name="id" value={formId} />
      <FormSelect sent={sent} name="date" label="On which day" value={today?.date ?? ""}>
        {days.map(({ date, label }) => (
          <option key={date} value={date}>
            {label}
          </option>
        ))}
      </FormSelect>
      <TextField
        name="message"
        label="Tell your lead"
        error={sent.errorOf("message")}
        defaultValue={sent.typed("message")}
        maxLength={500}
        required
      />
      <button
        type="submit"
        className="button"
        data-tone="solid"
        data-rim="both"
        disabled={sent.isSending}
      >
        Send it
      </button>
      <p role="status" className="font-[650] text-danger">
        {sent.problem?.errors ? "Look at what is marked." : sent.problem?.detail}
      </p>
    </form>
  );
}
