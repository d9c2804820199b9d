"use client";

import Form from "next/form";
import type { ReactNode } from "react";

/**
 * Filters as a sentence across the seam: its choices stand in the address, so a view can be kept and
 * sent. A choice takes effect at once; a text with Enter.
 */
export function SentenceForm({
  action,
  book,
  day,
}: {
  action: string;
  book: ReactNode;
  day: ReactNode;
}) {
  return (
    <Form
      action={action}
      role="search"
      className="desk-ask sentence"
      onChange={(event) => {
        if (event.target instanceof HTMLSelectElement) event.currentTarget.requestSubmit();
      }}
    >
      <p>{book}</p>
      <p>{day}</p>
    </Form>
  );
}
