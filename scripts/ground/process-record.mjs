import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { Stop } from "./say.mjs";

/** When a process began, in the kernel's ticks: tells it from a later one with the same number. */
function startTicks(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    // the name in parentheses may hold spaces; the 22nd field is the 20th after it
    const [state, ...rest] = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    return state === "Z" ? null : rest[18];
  } catch {
    return null; // no such process
  }
}

/** Says which process this is, so that it is known again even when its number is used twice. */
export function identityOf(pid) {
  return { pid, ticks: startTicks(pid) };
}

/** Tells whether the process of an identity still runs. */
export function isAlive(identity) {
  return Boolean(identity?.ticks) && startTicks(identity.pid) === identity.ticks;
}

/** The record of a running installation: who supervises, who serves, where. */
export function recordIn(file, readFile = readFileSync) {
  const read = () => {
    if (!existsSync(file)) return null;
    try {
      return JSON.parse(readFile(file, "utf8"));
    } catch (error) {
      if (error instanceof SyntaxError) return null; // half written when the machine stopped
      if (error.code !== "EACCES") throw error;
      throw new Stop("Another user runs this Bookmatch, root perhaps: do this as that one.");
    }
  };
  return {
    read,
    // it holds sign-ins: for the one who started it alone
    write: (more) =>
      writeFileSync(file, JSON.stringify({ ...read(), ...more }, null, 2), { mode: 0o600 }),
    remove: () => rmSync(file, { force: true }),
  };
}
