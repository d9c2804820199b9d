import type { ReactNode } from "react";
import { personOf } from "@/app/_server/person";
import { siteOf } from "@/app/_server/site";
import { signOut } from "@/app/sign-in/actions";
import { SignOutForm } from "@/components/access/sign-out-form";
import { OfficeHead } from "@/components/shell/office-head";
import { OfficeMenu } from "@/components/shell/office-menu";
import { Purfling } from "@/components/ui/purfling";
import { roleWords } from "@/lib/access/role-words";
import { roomsFor } from "@/lib/access/rooms";
import "@/app/styles/analytics.css";
import "@/app/styles/desk.css";
import "@/app/styles/ends.css";
import "@/app/styles/paper.css";
import "@/app/styles/records.css";

/** Draws the office around a page. It guards nothing: each page asks for its person itself. */
export default async function OfficeLayout({ children }: { children: ReactNode }) {
  const person = await personOf();
  const held = person.ok ? person.value.held : [];
  const site = person.ok ? await siteOf(person.value.siteId) : null;
  return (
    <div className="leaves desk">
      <Purfling />
      <OfficeHead
        site={site?.name ?? ""}
        rooms={roomsFor(held)}
        menu={
          person.ok && (
            <OfficeMenu
              name={person.value.name}
              roles={roleWords(held)}
              signOut={<SignOutForm action={signOut} />}
            />
          )
        }
      />
      <main className="desk-main">{children}</main>
    </div>
  );
}
