import { type IconName, iconPaths, type Stroke } from "@/components/ui/icon-paths";

/**
 * One of our line icons, in the colour and size of the words beside it. It is silent for screen
 * readers unless a `label` says what it stands for where no word does.
 */
export function Icon({
  name,
  label,
  className = "",
}: {
  name: IconName;
  label?: string;
  className?: string;
}) {
  const strokes: readonly Stroke[] = iconPaths[name];
  return (
    <svg
      viewBox="0 0 32 32"
      className={`icon ${className}`}
      role="img"
      aria-label={label}
      aria-hidden={label ? undefined : true}
    >
      {strokes.map(({ d, solid, width, dash }) => (
        <path
          key={d}
          d={d}
          fill={solid ? "currentColor" : undefined}
          strokeWidth={width}
          strokeDasharray={dash}
        />
      ))}
    </svg>
  );
}
