import type { Metadata } from "next";
import type { ReactNode } from "react";
import "@/app/styles/me.css";
import "@/app/styles/records.css";

export const metadata: Metadata = { title: "My hours" };

/** Two leaves as wide as a phone; each page asks for its person itself. */
export default function MeLayout({ children }: { children: ReactNode }) {
  return <div className="me-page">{children}</div>;
}
