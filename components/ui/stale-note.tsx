import type { ReactNode } from "react";
import { Icon } from "@/components/ui/icon";

/** Says that what a page shows is no longer fresh: `as of 11:20`, and what is the matter. */
export function StaleNote({ asOf, children }: { asOf: string; children?: ReactNode }) {
  return (
    <p role="status" className="tag text-ink-2">
      <Icon name="clock" />
      <span>
        as of {asOf}
        {children && <>. {children}</>}
      </span>
    </p>
  );
}
