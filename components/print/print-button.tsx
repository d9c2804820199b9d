"use client";

import { Button } from "@/components/ui/button";

/** Opens the browser's print window. */
export function PrintButton() {
  return (
    <p className="paper-act">
      <Button icon="print" tone="solid" rim="both" onClick={() => window.print()}>
        Print
      </Button>
    </p>
  );
}
