import { randomUUID } from "node:crypto";
import type { Metadata } from "next";
import { personFor } from "@/app/_server/page-actor";
import { addPolicy, choosePolicy, setRhythm } from "@/app/(office)/hours/policies/actions";
import { ChoiceForm, PolicyForm, RhythmForm } from "@/components/policies/policy-forms";
import { ChoiceList, PolicyList } from "@/components/policies/policy-list";
import { findRhythm, listPolicyChoices, listPolicyVersions } from "@/db/pay/queries";
import { presetName } from "@/lib/pay/schema";
import { policyWords } from "@/lib/policies/words";
import "@/app/styles/periods.css";

export const metadata: Metadata = { title: "Pay policies" };

/** What is on file about pay on the left, what is being changed on the right. */
export default async function PoliciesPage() {
  const { scope } = await personFor("policies.see");
  const [versions, choices, rhythm] = await Promise.all([
    listPolicyVersions(scope),
    listPolicyChoices(scope),
    findRhythm(scope),
  ]);
  const names = [...new Set(versions.map(({ name }) => name))];
  const latest = Object.fromEntries(
    names.map((name) => [name, versions.filter((version) => version.name === name).length]),
  );
  const policies = versions
    .toReversed()
    .map(({ policy, ...version }) => ({ ...version, words: policyWords(policy) }));
  const shownChoices = choices
    .toReversed()
    .map(({ workerId, worker, name, policy, ...choice }) => ({
      ...choice,
      who: workerId === null ? "the site" : `${worker} ${name}`,
      policy: policy ?? "as the site",
    }));
  return (
    <div className="policy-leaves">
      <section aria-labelledby="policies-on-file">
        <h1 id="policies-on-file">Pay policies</h1>
        <p className="text-ink-2">
          A version governs the workweeks that begin while it is in force. Local law and agreements
          come first; the employer confirms that a policy meets them.
        </p>
        <PolicyList policies={policies} />
        <h2>Who is paid by what</h2>
        <ChoiceList choices={shownChoices} />
        <h2>Pay periods</h2>
        <p>
          {rhythm
            ? `${rhythm.days} days each, one begins on ${rhythm.startsOn}.`
            : "Nobody has said yet when a pay period begins."}
        </p>
      </section>
      <section aria-label="What is being changed">
        <h2>Add a version</h2>
        <PolicyForm action={addPolicy} presets={presetName.options} latest={latest} />
        <h2>Choose a policy</h2>
        <ChoiceForm action={choosePolicy} id={randomUUID()} policies={names} />
        <h2>Set the pay periods</h2>
        <RhythmForm action={setRhythm} id={randomUUID()} rhythm={rhythm} />
      </section>
    </div>
  );
}
