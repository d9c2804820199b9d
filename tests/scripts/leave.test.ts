import { spawn } from "node:child_process";
import { once } from "node:events";
import path from "node:path";
import { pathToFileURL } from "node:url";
import { describe, expect, test } from "vitest";
import { root } from "@/scripts/ground/place.mjs";

const ground = (name: string) => pathToFileURL(path.join(root, "scripts/ground", name)).href;

/** A command that runs a test runner, which cleans up at SIGINT only. */
const runner = `
  process.on("SIGINT", () => { console.error("cleaned up"); process.exit(3); });
  setInterval(() => undefined, 1000);
  console.error("at work");
`;
const command = `
  import { personLeaves } from "${ground("leave.mjs")}";
  import { run } from "${ground("run.mjs")}";
  const leaving = personLeaves("SIGINT");
  const how = { show: true, mayFail: true, apart: true };
  const { code } = await run(process.execPath, ["-e", ${JSON.stringify(runner)}], how);
  console.log(code, leaving.isOver);
`;

describe("personLeaves", () => {
  test.each(["SIGTERM", "SIGINT", "SIGHUP"] as const)(
    "lets what runs clean up when %s comes to the command alone, also twice",
    async (signal) => {
      const child = spawn(process.execPath, ["--input-type=module", "-e", command]);
      let [said, answer] = ["", ""];
      child.stdout.on("data", (text) => {
        answer += text;
      });
      child.stderr.on("data", (text) => {
        said += text;
        if (String(text).includes("at work")) for (const _ of [1, 2]) child.kill(signal);
      });
      const [code] = await once(child, "close");
      expect({ code, answer }).toEqual({ code: 0, answer: "3 true\n" });
      expect(said.match(/cleaned up/g)).toHaveLength(1);
      expect(said.match(/Stopping/g)).toHaveLength(1);
    },
  );
});
