import type { ReactNode } from "react";
import { ThemeSwitch } from "@/components/shell/theme-switch";
import { Icon } from "@/components/ui/icon";

/** Who is signed in, and what belongs to them: colours, the own password, signing out. */
export function OfficeMenu({
  name,
  roles,
  signOut,
}: {
  name: string;
  roles: string;
  signOut: ReactNode;
}) {
  return (
    <details className="desk-menu">
      <summary>
        <span className="desk-who">
          {name}
          {roles && <span className="text-ink-2">, {roles}</span>}
        </span>
        <Icon name="down" />
      </summary>
      <div className="desk-menu-leaf">
        <ThemeSwitch />
        <a href="/account" className="button">
          Your password
        </a>
        {signOut}
      </div>
    </details>
  );
}
