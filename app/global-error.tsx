"use client";

import Fault from "@/app/error";
import "./globals.css";

/** A fault of ours in the frame of all pages: the same words, in a frame of its own. */
export default function GlobalFault(props: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <html lang="en" suppressHydrationWarning>
      <head>
        <title>Bookmatch</title>
        <script src="/theme.js" />
      </head>
      <body>
        <Fault {...props} />
      </body>
    </html>
  );
}
