import { Head, Ledger } from "@/components/ui/table";
import { policyLabel } from "@/lib/policies/in-force";
import { dayText } from "@/lib/time/format";

/** A version of a policy as the page shows it. */
export interface ShownPolicy {
  name: string;
  version: number;
  effectiveOn: string;
  words: readonly string[];
  enteredBy: string;
  reason: string;
}

/** Who is paid by what. */
export interface ShownChoice {
  who: string;
  policy: string;
  effectiveOn: string;
  enteredBy: string;
  reason: string;
}

const on = (date: string) => `${dayText(date, "en-GB")} ${date.slice(0, 4)}`;

/** Every version of every policy, the latest first: none is ever changed. */
export function PolicyList({ policies }: { policies: readonly ShownPolicy[] }) {
  return (
    <Ledger caption="Pay policies">
      <thead>
        <tr>
          <Head>Policy</Head>
          <Head>Rules</Head>
          <Head>Since</Head>
        </tr>
      </thead>
      <tbody>
        {policies.map((policy) => (
          <tr key={policyLabel(policy)} className="align-top">
            <td className="py-2 font-[650] whitespace-nowrap">{policyLabel(policy)}</td>
            <td className="py-2">
              <ul className="policy-rules">
                {policy.words.map((words) => (
                  <li key={words}>{words}</li>
                ))}
              </ul>
            </td>
            <td className="py-2 text-ink-2">
              {on(policy.effectiveOn)}
              <br />
              {policy.enteredBy}: {policy.reason}
            </td>
          </tr>
        ))}
      </tbody>
    </Ledger>
  );
}

/** By which policy the site and single workers are paid, in the order of entry. */
export function ChoiceList({ choices }: { choices: readonly ShownChoice[] }) {
  return (
    <Ledger caption="Who is paid by what">
      <thead>
        <tr>
          <Head>Who</Head>
          <Head>Policy</Head>
          <Head>From</Head>
        </tr>
      </thead>
      <tbody>
        {choices.map(({ who, policy, effectiveOn, enteredBy, reason }) => (
          <tr key={`${who} ${policy} ${effectiveOn} ${reason}`} className="align-top">
            <td className="py-2 font-[650]">{who}</td>
            <td className="py-2 whitespace-nowrap">{policy}</td>
            <td className="py-2 text-ink-2">
              {on(effectiveOn)}
              <br />
              {enteredBy}: {reason}
            </td>
          </tr>
        ))}
      </tbody>
    </Ledger>
  );
}
