import type { Metadata } from "next";
import { v7 as uuidv7 } from "uuid";
import { readCards } from "@/app/_server/cards";
import { personFor } from "@/app/_server/page-actor";
import { agree } from "@/app/(office)/hours/agreement/actions";
import { AgreementForm } from "@/components/agreement/agreement-form";
import { PeriodSentence } from "@/components/agreement/period-sentence";
import { Empty } from "@/components/ui/empty";
import { cardLines } from "@/lib/agreement/page";
import { agreementQuery } from "@/lib/agreement/schema";

export const metadata: Metadata = { title: "Agree to hours" };

interface AgreementProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The cards of one's own people: what wants a look, what can be agreed to, and what is agreed. */
export default async function AgreementPage({ searchParams }: AgreementProps) {
  const { scope, cells } = await personFor("hours.agree");
  const { period } = agreementQuery.parse(await searchParams);
  const read = await readCards(scope, { within: cells, asked: period, now: new Date() });
  const { toLookAt, agreed } = cardLines(read.cards);
  return (
    <>
      <h1 className="sr-only">Agree to hours</h1>
      <PeriodSentence
        range={read.range}
        periods={read.periods}
        counts={{ toLookAt: toLookAt.length, agreed: agreed.length }}
      />
      {read.cards.length === 0 ? (
        <Empty>Nobody of your cells was in on these days. Choose another period.</Empty>
      ) : (
        <AgreementForm
          action={agree}
          formId={uuidv7()}
          toLookAt={toLookAt}
          agreed={agreed}
          range={read.range}
        />
      )}
    </>
  );
}
