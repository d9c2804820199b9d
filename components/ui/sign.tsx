import { type SignName, type SignShape, signPictures } from "@/components/ui/sign-pictures";

const triangle = "M50 4L96 84Q97 86 95 86H5Q3 86 4 84Z";

/** The frame of a sign; its colours are the same in both themes. */
function Frame({ shape }: { shape: SignShape }) {
  if (shape === "must") return <circle cx="50" cy="50" r="48" fill="var(--mandatory)" />;
  if (shape === "must-not") return <circle cx="50" cy="50" r="48" fill="#fff" />;
  return (
    <g fill="var(--caution)" strokeLinejoin="round">
      <path d={triangle} stroke="var(--caution)" strokeWidth="11" />
      <path d={triangle} stroke="var(--caution-ink)" strokeWidth="6" />
    </g>
  );
}

/** The ring and the bar of what must not be, over its picture. */
function Bar() {
  return (
    <g fill="none" stroke="var(--prohibition)" strokeWidth="9">
      <circle cx="50" cy="50" r="43.5" />
      <path d="M19 19l62 62" />
    </g>
  );
}

/** A safety sign. Its `label` says what it means; beside words that say it, leave it out. */
export function Sign({
  name,
  label,
  className = "",
}: {
  name: SignName;
  label?: string;
  className?: string;
}) {
  const { shape, picture } = signPictures[name];
  return (
    <svg
      viewBox={shape === "beware" ? "-6 -4 112 98" : "0 0 100 100"}
      className={className}
      role="img"
      aria-label={label}
      aria-hidden={label ? undefined : true}
    >
      <Frame shape={shape} />
      <g fill="var(--caution-ink)" color="var(--caution-ink)">
        {picture}
      </g>
      {shape === "must-not" && <Bar />}
    </svg>
  );
}
