import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL(".", import.meta.url));
const empty = fileURLToPath(new URL("tests/setup/empty.ts", import.meta.url));

/** `server-only` throws outside Next's server build; in tests the rule is dependency-cruiser's. */
const alias = [
  { find: /^@\//, replacement: root },
  { find: "server-only", replacement: empty },
];

/** Server code reads its environment at the first use; its pool comes from `ownDatabase`. */
const env = {
  DATABASE_URL: "postgres://nobody@127.0.0.1:1/use-ownDatabase",
  SESSION_SECRET: "a secret of the tests, known to all of them",
  LOG_LEVEL: "silent",
};

/** `npm run test:deep` tries every law many more times. */
const isDeep = Boolean(process.env.BOOKMATCH_DEEP);

/** Only for what hangs: how long a test may take says nothing of the code on a busy machine. */
const PATIENCE_MS = 120_000;

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: "unit",
          env,
          include: ["tests/**/*.test.{ts,tsx}"],
          exclude: ["tests/**/*.db.test.ts"],
          testTimeout: isDeep ? 600_000 : PATIENCE_MS,
          setupFiles: ["tests/setup/console-clean.ts", "tests/setup/laws.ts"],
        },
      },
      {
        resolve: { alias },
        test: {
          name: "db",
          env,
          include: ["tests/**/*.db.test.ts"],
          globalSetup: ["tests/setup/database.ts"],
          setupFiles: ["tests/setup/console-clean.ts", "tests/setup/laws.ts"],
          isolate: false,
          testTimeout: isDeep ? 600_000 : PATIENCE_MS,
          hookTimeout: PATIENCE_MS,
        },
      },
    ],
  },
});
