import { redirect } from "next/navigation";
import { personFor } from "@/app/_server/page-actor";
import { homeFor } from "@/lib/access/rooms";

/** The office begins where each person's work is. */
export default async function HomePage() {
  const { person } = await personFor("account.change");
  redirect(homeFor(person.held));
}
