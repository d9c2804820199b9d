import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import type { StandardsView } from "@/lib/replay/page";

/** Whose standards the page shows, and of which day, as a sentence. */
export function StandardsFilter({ view }: { view: StandardsView }) {
  const { model, models, stages, query, day } = view;
  return (
    <SentenceForm
      action="/standards"
      book={
        <>
          {"Standards for "}
          <Choice
            name="model"
            label="Model"
            value={model}
            options={models.map((name) => [name, name] as const)}
          />
          {" through "}
          <Choice
            name="stage"
            label="Stage"
            value={query.stage}
            options={[["", "all stages"], ...stages.map((stage) => [stage, stage] as const)]}
          />
        </>
      }
      day={
        <>
          {"in force on "}
          <input key={day} name="on" type="date" aria-label="In force on" defaultValue={day} />{" "}
          <button type="submit">Show</button>
        </>
      }
    />
  );
}
