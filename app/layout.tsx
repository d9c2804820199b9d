import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Bookmatch", template: "%s · Bookmatch" },
  description: "Hours against standard, for every operation on every instrument.",
};

export const viewport: Viewport = {
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#f3e8c0" },
    { media: "(prefers-color-scheme: dark)", color: "#2b2412" },
  ],
};

/** Every page's frame. The theme script runs before the first paint, so a page never flashes. */
export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" suppressHydrationWarning>
      <head>
        <script src="/theme.js" />
      </head>
      <body>{children}</body>
    </html>
  );
}
