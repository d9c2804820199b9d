import type { ButtonHTMLAttributes, ReactNode } from "react";
import { Icon } from "@/components/ui/icon";
import type { IconName } from "@/components/ui/icon-paths";

/** Where a board is round: towards the rim of the page. Without one it is square all round. */
type Rim = "left" | "right" | "both" | "top-left" | "top-right" | "bottom-left" | "bottom-right";

interface PlateProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  children: ReactNode;
  icon?: IconName;
  /** puts the icon after the words: for going forward, on the day's rim */
  iconLast?: boolean;
  rim?: Rim;
  /** `solid` is the one primary act of a screen */
  tone?: "solid" | "danger" | "hold";
  /** a secondary target, which may be smaller than a thumb in a glove */
  minor?: boolean;
}

/** A kiosk's button: a board as high as a gloved thumb. Several in a `Board` share their kerfs. */
export function Plate({
  children,
  icon,
  iconLast = false,
  rim,
  tone,
  minor = false,
  className = "",
  ...rest
}: PlateProps) {
  return (
    <button
      type="button"
      {...rest}
      className={`plate ${iconLast ? "justify-between" : ""} ${className}`}
      data-rim={rim}
      data-tone={tone}
      data-minor={minor ? "" : undefined}
    >
      {icon && !iconLast && <Icon name={icon} />}
      <span>{children}</span>
      {icon && iconLast && <Icon name={icon} />}
    </button>
  );
}

interface AcrossPlateProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  children: ReactNode;
  /** what the act leads to, on the day's side of the seam */
  then?: ReactNode;
  icon?: IconName;
}

/** The act that closes the work: one solid board across the seam. */
export function AcrossPlate({ children, then, icon, className = "", ...rest }: AcrossPlateProps) {
  return (
    <button
      type="button"
      {...rest}
      className={`plate ${className}`}
      data-tone="solid"
      data-rim="both"
      data-across=""
    >
      <span>
        {icon && <Icon name={icon} />}
        {children}
      </span>
      <span>{then}</span>
    </button>
  );
}

/** One board cut into several plates, side by side or, `stacked`, one above the other. */
export function Board({
  children,
  stacked = false,
  className = "",
}: {
  children: ReactNode;
  stacked?: boolean;
  className?: string;
}) {
  return (
    <div className={`board ${className}`} data-stacked={stacked ? "" : undefined}>
      {children}
    </div>
  );
}
