"use client";

import type { ReactNode } from "react";
import type { Sent } from "@/components/shell/use-answer";
import { Button } from "@/components/ui/button";

/** The foot of a form: what stands in the way, if anything, and the one act. */
export function FormFoot({
  sent,
  submit,
  done,
  tone = "solid",
  children,
}: {
  sent: Pick<Sent<unknown>, "problem" | "isSending" | "isDone">;
  submit: string;
  /** Said after a yes, where the form stays. */
  done?: string;
  /** `plain` where the page is first for something else, `danger` where something is taken away. */
  tone?: "solid" | "plain" | "danger";
  children?: ReactNode;
}) {
  const { problem, isSending, isDone } = sent;
  const said = problem?.errors ? "Look at what is marked." : problem?.detail;
  return (
    <div className="flex flex-wrap items-center gap-4">
      <Button
        type="submit"
        rim="right"
        {...(tone === "plain" ? {} : { tone })}
        disabled={isSending}
      >
        {submit}
      </Button>
      {children}
      <p role="status" className={problem ? "text-danger font-[650]" : "text-ink-2"}>
        {said ?? (isDone ? done : undefined)}
      </p>
    </div>
  );
}
