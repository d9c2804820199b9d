import { spawn } from "node:child_process";
import { once } from "node:events";
import { openInstallation } from "./ground/installation.mjs";
import { checkFolders, root } from "./ground/place.mjs";
import { chooseAddress } from "./ground/plan.mjs";
import { next, runScript } from "./ground/programs.mjs";
import { main, say } from "./ground/say.mjs";

/** `npm run dev`: Next's development server on the installation's database. */
await main(async () => {
  checkFolders();
  process.on("SIGINT", () => say("")); // the terminal sends it to the server too, which then ends
  const { host, port } = await chooseAddress();
  const { env, close } = await openInstallation();
  try {
    const address = `http://${host}:${port}`;
    const prepared = await runScript("prepare.ts", [address], env, { mayFail: true, talk: true });
    if (prepared.code !== 0) return prepared.code;
    say(prepared.text);
    const own = { ...env, NODE_ENV: "development" };
    const args = [next, "dev", "-H", host, "-p", String(port)];
    const server = spawn(process.execPath, args, { cwd: root, env: own, stdio: "inherit" });
    await once(server, "exit");
    return 0;
  } finally {
    await close();
  }
});
