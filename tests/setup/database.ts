import type { TestProject } from "vitest/node";
import { startTestServer } from "@/scripts/ground/test-data.mjs";
import { ask, dropAll } from "@/tests/setup/clone";
import { makeTemplate } from "@/tests/setup/template";

declare module "vitest" {
  export interface ProvidedContext {
    /** The server for tests, as its superuser; ends in `/`, for a database's name. */
    server: string;
    template: string;
    /** Begins the names of this run's databases. */
    run: string;
  }
}

/** Starts the throw-away server, or uses the one that is up, and keeps the template current. */
export default async function setup(project: TestProject) {
  const { server, wasUp, stop } = await startTestServer();
  const run = `run_${process.pid}_`;
  project.provide("server", server);
  project.provide("template", await makeTemplate(server));
  project.provide("run", run);
  return async () => {
    await dropAll(server, run);
    if (!wasUp && (await isAlone(server))) await stop();
  };
}

/** Another run of the same clone may be using the server that this one started. */
async function isAlone(server: string): Promise<boolean> {
  const others = await ask(
    server,
    "select 1 from pg_stat_activity where backend_type = 'client backend' and pid <> pg_backend_pid()",
  );
  return others.rowCount === 0;
}
