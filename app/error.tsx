"use client";

import { SeamNotice } from "@/components/shell/seam-notice";
import { Button } from "@/components/ui/button";

/** A fault of ours while a page was made. Its reference finds it in the log. */
export default function Fault({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <SeamNotice title="Something went wrong on our side.">
      <p>What was saved is safe. Read the page again; if this comes back, tell your admin.</p>
      <Button tone="solid" rim="right" onClick={reset}>
        Read it again
      </Button>
      {error.digest && (
        <p className="text-t-2 text-ink-2">
          Reference <code>{error.digest}</code>
        </p>
      )}
    </SeamNotice>
  );
}
