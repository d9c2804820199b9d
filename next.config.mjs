/** What holds for every answer; a page's content policy comes from `proxy.ts`. */
const always = [
  { key: "x-content-type-options", value: "nosniff" },
  { key: "x-frame-options", value: "DENY" },
  { key: "referrer-policy", value: "same-origin" },
  { key: "cross-origin-opener-policy", value: "same-origin" },
  { key: "cross-origin-resource-policy", value: "same-origin" },
  // the kiosk scans with the camera and stays awake; nothing else is asked of the device
  {
    key: "permissions-policy",
    value:
      "camera=(self), screen-wake-lock=(self), fullscreen=(self), microphone=(), geolocation=()",
  },
];

const nothing = "default-src 'none'; frame-ancestors 'none'";

/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  experimental: { authInterrupts: true },
  typescript: { ignoreBuildErrors: false },
  serverExternalPackages: ["@node-rs/argon2", "pg", "pino", "bwip-js"],
  headers: async () => [
    { source: "/:path*", headers: always },
    { source: "/api/:path*", headers: [{ key: "content-security-policy", value: nothing }] },
  ],
};

export default config;
