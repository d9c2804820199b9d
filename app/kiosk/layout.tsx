import type { Metadata, Viewport } from "next";
import type { ReactNode } from "react";
import "./kiosk.css";
import "./sheet.css";

export const metadata: Metadata = { title: "Kiosk" };

export const viewport: Viewport = { viewportFit: "cover", interactiveWidget: "overlays-content" };

/** The kiosk fills its screen; there is nothing around it. */
export default function KioskLayout({ children }: { children: ReactNode }) {
  return children;
}
