import type { MetadataRoute } from "next";

/** What a tablet installs: the kiosk, full screen. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    name: "Bookmatch",
    short_name: "Bookmatch",
    description: "Hours against standard, for every operation on every instrument.",
    start_url: "/kiosk",
    scope: "/",
    display: "fullscreen",
    background_color: "#f6f8f5",
    theme_color: "#f3e8c0",
    icons: [{ src: "/icon.svg", sizes: "any", type: "image/svg+xml" }],
  };
}
