import Link from "next/link";
import type { ReactNode } from "react";
import { SeamNotice } from "@/components/shell/seam-notice";

/** For an account that is no worker's: there are no hours of one's own. */
export function NoWorker({ office, signOut }: { office: string | null; signOut: ReactNode }) {
  return (
    <SeamNotice title="Your account is no worker's yet.">
      <p>An admin can join it to your number. Then your hours are here.</p>
      {office && (
        <Link href={office} className="button" data-rim="right">
          To the office
        </Link>
      )}
      {signOut}
    </SeamNotice>
  );
}
