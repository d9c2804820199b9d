import { Choice } from "@/components/shell/choice";
import { SentenceForm } from "@/components/shell/sentence-form";
import { dayText } from "@/lib/time/format";
import { addDays } from "@/lib/time/site-day";

/** Of which days the cards are, as a sentence, and how many wait. */
export function PeriodSentence({
  range,
  periods,
  counts: { toLookAt, agreed },
}: {
  range: { from: string; to: string };
  periods: readonly { from: string; to: string }[];
  counts: { toLookAt: number; agreed: number };
}) {
  const words = ({ from, to }: { from: string; to: string }) =>
    `${dayText(from, "en-GB")} to ${dayText(addDays(to, -1), "en-GB")}`;
  return (
    <SentenceForm
      action="/hours/agreement"
      book={
        <>
          {"Your cells' cards for "}
          {periods.length > 0 ? (
            <Choice
              name="period"
              label="Pay period"
              value={range.from}
              options={periods.map((period) => [period.from, words(period)] as const)}
            />
          ) : (
            <b>{words(range)}</b>
          )}
        </>
      }
      day={
        <span className="text-t-3">
          <b>{agreed}</b> of {toLookAt + agreed} agreed
          <span className="ml-6">
            <b>{toLookAt}</b> to look at
          </span>
        </span>
      }
    />
  );
}
