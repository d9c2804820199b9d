/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  experimental: { authInterrupts: true },
  typescript: { ignoreBuildErrors: false },
  serverExternalPackages: ["@node-rs/argon2", "pg", "pino", "bwip-js"],
};

export default config;
