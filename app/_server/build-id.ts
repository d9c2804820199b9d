import "server-only";
import { readFileSync } from "node:fs";

let build: string | undefined;

/** The id of the build that answers: an idle kiosk reloads when it is not its own. */
export function buildId(): string {
  build ??= readBuildId();
  return build;
}

function readBuildId(): string {
  try {
    return readFileSync(".next/BUILD_ID", "utf8").trim();
  } catch {
    return "development"; // without a build there is no other to change to
  }
}
