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
    <div className="desk-menu">
      <button
        type="button"
        popoverTarget="desk-menu"
        className="desk-who"
        aria-label={[name, roles, "menu"].filter(Boolean).join(", ")}
      >
        <span>
          {name}
          {roles && <span className="text-ink-2">, {roles}</span>}
        </span>
        <Icon name="down" />
      </button>
      <div id="desk-menu" popover="auto" className="desk-menu-leaf">
        <p className="font-[650]">{name}</p>
        <ThemeSwitch />
        <a href="/account" className="button">
          Your password
        </a>
        {signOut}
      </div>
    </div>
  );
}
