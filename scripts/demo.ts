import { findDemoSignIns } from "@/db/seed/sign-ins";
import { command, Refusal, readOptions, withDatabase } from "./ground/connect";
import { readable } from "./ground/demo";

/** `npm run demo [-- --json]`: prints the demo sign-ins again, for people or for programs. */
await command(async () => {
  const values = readOptions({ json: { type: "boolean" } }, "npm run demo [-- --json]");
  const signIns = await withDatabase(findDemoSignIns);
  if (!signIns) throw new Refusal("The demo is not loaded here: this is somebody's own factory.");
  process.stdout.write(`${values.json ? JSON.stringify(signIns) : readable(signIns, true)}\n`);
});
