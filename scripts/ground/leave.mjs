import { stopRunning } from "./run.mjs";
import { say } from "./say.mjs";

/**
 * Resolves `promise` at the first Ctrl-C, stop request or closed terminal; whatever runs then is
 * asked to end by `signal`.
 *
 * @param {"SIGINT" | "SIGTERM"} signal test runners clean up at SIGINT only
 */
export function personLeaves(signal) {
  const leaving = { isOver: false, promise: Promise.resolve() };
  leaving.promise = new Promise((resolve) => {
    const leave = () => {
      if (leaving.isOver) return; // npm hands a Ctrl-C on that the terminal has sent already
      say("\nStopping …");
      leaving.isOver = true;
      stopRunning(signal);
      resolve();
    };
    for (const name of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(name, leave);
  });
  return leaving;
}
