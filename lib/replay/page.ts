import type { ChangeFacts } from "@/lib/replay/decide-change";
import { type Drafted, draftedOf } from "@/lib/replay/drafted";
import { type Effect, effectOf, type TouchedOperation } from "@/lib/replay/effect";
import { knownSince } from "@/lib/replay/known-since";
import { type FinishedOperation, type Replay, replay } from "@/lib/replay/replay";
import { type DatedRow, standardHistory } from "@/lib/standards/history";
import { type EnteredRow, type StandardLine, standardLines } from "@/lib/standards/lines";
import type { StandardsQuery } from "@/lib/standards/schema";
import type { DayRule } from "@/lib/time/site-day";

/** A model on file. */
interface ModelRow {
  name: string;
  createdAt: Date;
  firstStandardOn: string | null;
  options: readonly string[];
}

/** A ticket's operation as it is listed; its standards come with the entries. */
type TicketOperation = Omit<TouchedOperation & FinishedOperation, "standards" | "finishedMs"> & {
  finishedMs: number | null;
};

/** All that the page was given. */
export interface StandardsFacts {
  models: readonly ModelRow[];
  routing: readonly { operation: string; name: string; stage: string; cell: string }[];
  /** Ever entered for the model. */
  entries: readonly EnteredRow[];
  /** Of the operation that is open. */
  operations: readonly TicketOperation[];
}

/** The operation that is open: what held when, what is drafted, and what that would do. */
export interface OpenStandard {
  operation: string;
  name: string;
  cell: string;
  /** Whose rows these are: null for the base, else the option that adds to it. */
  option: string | null;
  options: readonly string[];
  history: DatedRow<EnteredRow>[];
  /** As the form is filled: what was drafted, else what is in force. */
  drafted: Drafted | null;
  replay: Replay | null;
  effect: Effect | null;
  /** One setup serves several lots here, so the replay leaves it out. */
  leavesSetupOut: boolean;
}

export interface StandardsView {
  query: StandardsQuery;
  model: string;
  models: readonly string[];
  stages: readonly string[];
  /** The day on which "in force" is asked. */
  day: string;
  today: string;
  lines: StandardLine[];
  open: OpenStandard | null;
}

/** Puts the page together: the model's standards on a day, and the one that is open. */
export function standardsPage(
  facts: StandardsFacts,
  { query, today, rules }: { query: StandardsQuery; today: string; rules: readonly DayRule[] },
): StandardsView {
  const { models, routing, entries } = facts;
  const names = models.map(({ name }) => name);
  const model = query.model || (names.toSorted()[0] ?? "");
  const day = query.on || today;
  const lines = standardLines(routing, entries, day);
  const known = models.find(({ name }) => name === model);
  return {
    query,
    model,
    models: names,
    stages: [...new Set(routing.map(({ stage }) => stage))],
    day,
    today,
    lines: lines.filter(({ stage }) => !query.stage || stage === query.stage),
    open: known ? openStandard(facts, known, { query, today, rules }) : null,
  };
}

function openStandard(
  { routing, entries, operations }: StandardsFacts,
  model: ModelRow,
  { query, today, rules }: { query: StandardsQuery; today: string; rules: readonly DayRule[] },
): OpenStandard | null {
  const line = routing.find(({ operation }) => operation === query.op);
  if (!line) return null;
  const rows = entries.filter(({ operation }) => operation === query.op);
  const option = query.option || null;
  const change: ChangeFacts = {
    isInRouting: true,
    isOption: option === null || model.options.includes(option),
    modelSince: knownSince(model, rules),
    today,
    rows,
  };
  const drafted = draftedOf({ ...query, model: model.name }, change);
  const draft = drafted?.entry ?? null;
  const touched = operations.map((one) => ({ ...one, standards: rows }));
  const wanted = touched.filter(({ options }) => option === null || options.includes(option));
  const finished = wanted.flatMap(({ finishedMs, ...one }) =>
    finishedMs === null ? [] : [{ ...one, finishedMs }],
  );
  return {
    ...line,
    option,
    options: model.options,
    history: standardHistory(
      rows.filter((row) => row.option === option),
      today,
    ),
    drafted,
    replay: draft && replay(finished, { draft, today, rules }),
    effect: draft && effectOf(touched, { draft, rules }),
    leavesSetupOut: operations.some(({ setupEarned }) => setupEarned === "when-booked"),
  };
}
