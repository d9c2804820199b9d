"use client";

import Link from "next/link";
import { type FormAction, useAnswer } from "@/components/shell/use-answer";
import { Button } from "@/components/ui/button";
import { minutesText } from "@/lib/standards/minutes";
import type { StandardEntry } from "@/lib/standards/schema";
import { dateText } from "@/lib/time/format";

/** Sets the change that the page shows, exactly as it was drafted, or drops it. */
export function SetForm({
  action,
  id,
  entry,
  drop,
}: {
  action: FormAction<unknown>;
  id: string;
  entry: StandardEntry;
  /** The address without the draft. */
  drop: string;
}) {
  const sent = useAnswer(action);
  const { setupSeconds, runSeconds, effectiveFrom, option, ...same } = entry;
  const figures = { setup: minutesText(setupSeconds), run: minutesText(runSeconds) };
  const values = { id, ...same, ...figures, option: option ?? "", from: effectiveFrom };
  return (
    <form action={sent.send} className="standards-foot">
      {Object.entries(values).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <span role="status" className={sent.problem ? "font-[650] text-danger" : "text-ink-2"}>
        {sent.problem ? sentence(sent.problem) : "Nothing is set yet."}
      </span>
      <Link href={drop} scroll={false} className="button">
        Drop the draft
      </Link>
      <Button type="submit" tone="solid" rim="right" disabled={sent.isSending}>
        Set {figures.setup} and {figures.run} from {dateText(effectiveFrom)}
      </Button>
    </form>
  );
}

function sentence({ detail, errors }: { detail: string; errors?: { message: string }[] }): string {
  return errors?.[0]?.message ?? detail;
}
