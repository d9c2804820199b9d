import { v7 as uuidv7 } from "uuid";
import { readOwnWeek } from "@/app/_server/own-week";
import { personFor } from "@/app/_server/page-actor";
import { agreeToOwn, object, tellEnd } from "@/app/me/actions";
import { signOut } from "@/app/sign-in/actions";
import { SignOutForm } from "@/components/access/sign-out-form";
import { AgreeForm } from "@/components/me/agree-form";
import { ChangesList } from "@/components/me/changes-list";
import { DayList } from "@/components/me/day-list";
import { LeftForm } from "@/components/me/left-form";
import { MeFoot } from "@/components/me/me-foot";
import { MeHead } from "@/components/me/me-head";
import { NoWorker } from "@/components/me/no-worker";
import { WeekHero } from "@/components/me/week-hero";
import { homeFor } from "@/lib/access/rooms";
import { meQuery } from "@/lib/me/schema";

interface MeProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** One's own hours on a phone: tapped and paid side by side, and a word where something is wrong. */
export default async function MePage({ searchParams }: MeProps) {
  const { person, scope } = await personFor("me.see");
  const query = meQuery.parse(await searchParams);
  const now = new Date();
  const own = person.workerId
    ? await readOwnWeek(scope, { workerId: person.workerId, week: query.week, now })
    : null;
  const home = homeFor(person.held);
  const office = home === "/me" ? null : home;
  if (!own) return <NoWorker office={office} signOut={<SignOutForm action={signOut} />} />;
  const { me, days, ends, changes } = own;
  return (
    <>
      <MeHead me={me} office={office} />
      <main>
        <h1 className="sr-only">My hours</h1>
        {ends.map((end) => (
          <LeftForm key={end.subject} action={tellEnd} formId={uuidv7()} end={end} />
        ))}
        <WeekHero week={own} />
        <DayList
          days={days}
          open={query.day}
          week={own.week.from}
          scaleSeconds={own.scaleSeconds}
        />
        <AgreeForm action={agreeToOwn} formId={uuidv7()} worker={me.number} days={days} />
        <ChangesList changes={changes} />
      </main>
      <MeFoot action={object} days={days} signOut={<SignOutForm action={signOut} />} />
    </>
  );
}
