"use client";

import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { Button } from "@/components/ui/button";

/** Leaves the office, on this browser and on the server. */
export function SignOutForm({ action }: { action: FormAction<unknown> }) {
  const sent = useAnswer(action);
  return (
    <form action={sent.send} className="grid">
      <Button type="submit" icon="out" rim="right" disabled={sent.isSending}>
        Sign out
      </Button>
    </form>
  );
}
