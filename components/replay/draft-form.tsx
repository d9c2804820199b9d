import Form from "next/form";
import { Button } from "@/components/ui/button";
import { InputField } from "@/components/ui/field";
import type { OpenStandard, StandardsView } from "@/lib/replay/page";
import { minutesText } from "@/lib/standards/minutes";
import { dateText } from "@/lib/time/format";

/** Drafts a change: nothing is set yet, the page shows what it would do. It stands in the address. */
export function DraftForm({ view, open }: { view: StandardsView; open: OpenStandard }) {
  const { query, model, today } = view;
  const holds = open.history.find(({ state }) => state === "in-force");
  const errors = open.drafted?.errors ?? {};
  const was = holds
    ? `Was ${minutesText(holds.setupSeconds)} and ${minutesText(holds.runSeconds)} since ${dateText(holds.effectiveFrom)}; days before keep it.`
    : "No standard holds today.";
  return (
    <Form action="/standards" scroll={false} className="standards-draft" key={open.operation}>
      {(["stage", "on", "option"] as const).map((name) => (
        <input key={name} type="hidden" name={name} value={query[name]} />
      ))}
      <input type="hidden" name="model" value={model} />
      <input type="hidden" name="op" value={open.operation} />
      <InputField
        name="setup"
        label="Setup, min a ticket"
        inputMode="decimal"
        autoComplete="off"
        required
        error={errors.setup}
        defaultValue={query.setup || minutesText(holds?.setupSeconds ?? 0)}
      />
      <InputField
        name="run"
        label="Run, min a piece"
        inputMode="decimal"
        autoComplete="off"
        required
        error={errors.run}
        defaultValue={query.run || (holds ? minutesText(holds.runSeconds) : "")}
      />
      <InputField
        name="from"
        label="Takes effect"
        type="date"
        required
        error={errors.from}
        defaultValue={query.from || today}
      />
      <InputField
        name="reason"
        label="Because"
        maxLength={300}
        required
        className="standards-reason"
        error={errors.reason}
        defaultValue={query.reason}
      />
      <p className="standards-foot">
        <span className="text-ink-2">{was}</span>
        <Button type="submit" rim="right" {...(open.drafted?.entry ? {} : { tone: "solid" })}>
          See what it does
        </Button>
      </p>
    </Form>
  );
}
