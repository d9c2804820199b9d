"use client";

import { type ReactNode, useEffect, useId, useRef } from "react";

/**
 * A question across the seam, in the browser's own dialog: focus stays inside it, Escape closes
 * it. It is shown while `open`; `onClose` is called however it is left.
 */
export function Dialog({
  open,
  title,
  onClose,
  children,
  className = "",
}: {
  open: boolean;
  title: string;
  onClose: () => void;
  children: ReactNode;
  className?: string;
}) {
  const dialog = useRef<HTMLDialogElement>(null);
  const heading = useId();
  useEffect(() => {
    const shown = dialog.current;
    if (!shown || shown.open === open) return;
    if (open) shown.showModal();
    else shown.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={heading}
      className={`dialog ${className}`}
      onClose={onClose}
    >
      <h2 id={heading} className="mb-4 text-t-5">
        {title}
      </h2>
      {children}
    </dialog>
  );
}
