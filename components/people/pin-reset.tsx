"use client";

import { PinShown } from "@/components/people/pin-shown";
import { FormFoot } from "@/components/shell/form-foot";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import type { GivenPin } from "@/lib/people/schema";

/** Gives a worker another random PIN and shows it once. The old one ends at once. */
export function PinReset({
  action,
  worker,
}: {
  action: FormAction<GivenPin>;
  worker: { number: string; name: string };
}) {
  const sent = useAnswer(action);
  if (sent.value) return <PinShown given={sent.value} />;
  return (
    <form action={sent.send} className="desk-form">
      <input type="hidden" name="worker" value={worker.number} />
      <p>
        {worker.name} gets another PIN, drawn at random. The old one ends at once; a shift that runs
        goes on.
      </p>
      <FormFoot sent={sent} submit="Give a new PIN" />
    </form>
  );
}
