import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL(".", import.meta.url));
const empty = fileURLToPath(new URL("tests/setup/empty.ts", import.meta.url));

/** `server-only` throws outside Next's server build; in tests the rule is dependency-cruiser's. */
const alias = [
  { find: /^@\//, replacement: root },
  { find: "server-only", replacement: empty },
];

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: "unit",
          include: ["tests/**/*.test.{ts,tsx}"],
          exclude: ["tests/**/*.db.test.ts"],
          setupFiles: ["tests/setup/console-clean.ts"],
        },
      },
      {
        resolve: { alias },
        test: {
          name: "db",
          include: ["tests/**/*.db.test.ts"],
          globalSetup: ["tests/setup/database.ts"],
          setupFiles: ["tests/setup/console-clean.ts"],
          testTimeout: 20_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
