import type { ButtonHTMLAttributes, ReactNode } from "react";
import { Icon } from "@/components/ui/icon";
import type { IconName } from "@/components/ui/icon-paths";

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  children: ReactNode;
  icon?: IconName;
  rim?: "left" | "right" | "both";
  /** `solid` is the one primary act of a page */
  tone?: "solid" | "danger";
}

/** A button of the desk. For a link that looks like one, give an `a` the class `button`. */
export function Button({ children, icon, rim, tone, className = "", ...rest }: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      className={`button ${className}`}
      data-rim={rim}
      data-tone={tone}
    >
      {icon && <Icon name={icon} />}
      {children}
    </button>
  );
}
