import { spawn } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { expect, test } from "@playwright/test";
import { root } from "@/scripts/ground/place.mjs";
import { freePortFrom } from "@/scripts/ground/ports.mjs";
import { run } from "@/scripts/ground/run.mjs";

/** An installation of this file's own, empty, started as a person starts it. */
const data = mkdtempSync(path.join(tmpdir(), "bookmatch-start-"));
const env: NodeJS.ProcessEnv = { ...process.env, BOOKMATCH_DATA: data, BOOKMATCH_DEMO: "0" };

const script = (name: string, ...args: string[]) =>
  run(process.execPath, [path.join("scripts", name), ...args], { cwd: root, env, mayFail: true });
const recordedPid = (who: "server" | "supervisor") =>
  (
    JSON.parse(readFileSync(path.join(data, "running.json"), "utf8")) as Record<
      string,
      { pid: number }
    >
  )[who]?.pid ?? 0;
const health = async (address: string) => (await fetch(`${address}/api/health`)).status;

/** Starts Bookmatch and waits until it says that it runs; gives its words and its process. */
async function start() {
  const child = spawn(process.execPath, ["scripts/start.mjs"], { cwd: root, env });
  let said = "";
  const ended = new Promise<number | null>((resolve) => child.on("exit", resolve));
  child.stderr.on("data", (text) => {
    said += text;
  });
  await expect.poll(() => said, { timeout: 90_000 }).toMatch(/Stop it with|Error|did not/);
  expect(said).toContain("Bookmatch is running");
  return { said, child, ended };
}

test.describe.configure({ mode: "serial" });

test.beforeAll(async () => {
  env.PORT = String(await freePortFrom(29_000));
});

test.afterAll(async () => {
  await script("stop.mjs");
  rmSync(data, { recursive: true, force: true });
});

test("an empty installation starts, survives what is killed under it, and keeps its data", async () => {
  test.setTimeout(300_000);
  const address = `http://127.0.0.1:${env.PORT}`;
  const first = await start();
  expect(first.said).toMatch(/\/sign-in\/first\?token=[\w-]{43}/);
  expect(await health(address)).toBe(200);

  const again = await script("start.mjs");
  expect(again.code).toBe(0);
  expect(again.text).toContain("already running");

  // the web server dies: its supervisor starts another
  process.kill(recordedPid("server"), "SIGKILL");
  await expect.poll(() => health(address).catch(() => 0), { timeout: 60_000 }).toBe(200);

  // the database server dies: it comes back under the running web server
  const [postmaster] = readFileSync(path.join(data, "cluster/postmaster.pid"), "utf8").split("\n");
  process.kill(Number(postmaster), "SIGKILL");
  await expect.poll(() => health(address).catch(() => 0), { timeout: 60_000 }).toBe(200);

  // all is stopped by Ctrl-C, the database server too
  first.child.kill("SIGINT");
  expect(await first.ended).toBe(0);
  await expect(health(address)).rejects.toThrow();

  // a stopped installation is opened for a command, and closed again
  const key = await script("with-database.mjs", "key.ts", "--role", "payroll");
  expect(key.text).toMatch(/^bm_[\w-]{43}$/m);
  expect((await script("stop.mjs")).text).toContain("was not running");
  const mistaken = await script("with-database.mjs", "key.ts", "--rolle", "payroll");
  expect(mistaken.code).toBe(1);
  expect(mistaken.text).toContain("Unknown option '--rolle'. Say: npm run key -- --role");

  // the supervisor dies: what it leaves behind is ended, and the data is as it was: the key is known
  const second = await start();
  second.child.kill("SIGKILL");
  await second.ended;
  const third = await start();
  const bearer = /^bm_[\w-]{43}$/m.exec(key.text)?.[0];
  const headers = { authorization: `Bearer ${bearer}` };
  const refused = await fetch(`${address}/api/v1/segments?from=2026-01-01&to=2026-01-02`, {
    headers,
  });
  expect(refused.status).toBe(403);
  await script("stop.mjs");
  expect(await third.ended).toBe(0);
});
