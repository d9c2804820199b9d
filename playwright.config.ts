import { defineConfig, devices } from "@playwright/test";
import { isRoot } from "@/scripts/ground/place.mjs";

/** Runs after `scripts/test.mjs` made the build and the demo data: `npm run test:browser`. */
export default defineConfig({
  // `npm test` runs the first; pictures of every screen are taken when asked for
  projects: [
    { name: "browser", testDir: "tests/browser" },
    { name: "pictures", testDir: "tests/pictures" },
  ],
  outputDir: "test-results",
  workers: 1, // two cores: the browser and the server that it talks to
  forbidOnly: true,
  timeout: 120_000,
  expect: { timeout: 10_000 },
  reporter: process.env.PLAYWRIGHT_JSON_OUTPUT_FILE ? [["list"], ["json"]] : [["list"]],
  use: {
    ...devices["Desktop Chrome"],
    trace: "retain-on-failure",
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: "/usr/bin/chromium",
      args: isRoot ? ["--no-sandbox"] : [],
    },
  },
});
