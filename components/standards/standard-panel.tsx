import Link from "next/link";
import { DraftForm } from "@/components/replay/draft-form";
import { SetForm } from "@/components/replay/set-form";
import type { FormAction } from "@/components/shell/use-answer";
import { standardsAddress } from "@/components/standards/address";
import { StandardBoards } from "@/components/standards/standard-boards";
import { StandardEntries } from "@/components/standards/standard-entries";
import type { OpenStandard, StandardsView } from "@/lib/replay/page";
import { minutesText } from "@/lib/standards/minutes";
import { dateText } from "@/lib/time/format";

/** The operation that is open: what held when, the change that is drafted, and who entered what. */
export function StandardPanel({
  view,
  maySet,
  id,
  action,
}: {
  view: StandardsView;
  maySet: boolean;
  /** For the row that setting adds. */
  id: string;
  action: FormAction<unknown>;
}) {
  const { open, query, model } = view;
  if (!open) {
    return (
      <section>
        <p className="text-t-4 text-ink-2">
          Choose an operation to see what held when{maySet && " and to draft a change"}.
        </p>
      </section>
    );
  }
  const entry = open.drafted?.entry ?? null;
  return (
    <section className="grid content-start gap-5">
      <div>
        <h2 className="text-t-6">
          {open.name}, {model}
        </h2>
        <OptionLinks open={open} view={view} />
      </div>
      <JustSet open={open} id={query.set} />
      <StandardBoards history={open.history} draft={entry} />
      {maySet && (
        <>
          <DraftForm view={view} open={open} />
          {entry && (
            <SetForm
              key={JSON.stringify(entry)}
              action={action}
              id={id}
              entry={entry}
              drop={standardsAddress({ ...query, model, ...noDraft })}
            />
          )}
        </>
      )}
      <StandardEntries history={open.history} />
    </section>
  );
}

const noDraft = { setup: "", run: "", from: "", reason: "", set: "" };

/** Says which row was just set, once the page has come back with it. */
function JustSet({ open, id }: { open: OpenStandard; id: string }) {
  const row = open.history.find((each) => each.id === id);
  if (!row) return null;
  const figures = `${minutesText(row.setupSeconds)} and ${minutesText(row.runSeconds)} min`;
  return (
    <p role="status" className="font-[650]">
      Set: {figures} from {dateText(row.effectiveFrom)}.
    </p>
  );
}

/** For which tickets the rows are: all of the model, or what an option adds. */
function OptionLinks({ open, view }: { open: OpenStandard; view: StandardsView }) {
  if (open.options.length === 0) return null;
  const { query, model } = view;
  const choices = [
    { option: "", words: `every ${model}` },
    ...open.options.map((option) => ({ option, words: `more with ${option}` })),
  ];
  return (
    <nav aria-label="For which tickets" className="standards-options">
      {choices.map(({ option, words }) => (
        <Link
          key={option}
          href={standardsAddress({ ...query, model, ...noDraft, option })}
          scroll={false}
          aria-current={option === (open.option ?? "") || undefined}
        >
          {words}
        </Link>
      ))}
    </nav>
  );
}
