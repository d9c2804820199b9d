import type { Instrumentation } from "next";

/** Runs once when the server starts, not in a build: begins what goes on in the background. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs" || process.env.NEXT_PHASE) return;
  const { startJobs } = await import("@/app/_jobs/start");
  startJobs();
}

/** A page or form that broke: the reference that the person sees, with the reason beside it. */
export const onRequestError: Instrumentation.onRequestError = async (error, request, context) => {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { log } = await import("@/app/_server/log");
  const reference = error instanceof Error && "digest" in error ? error.digest : undefined;
  const [address] = request.path.split("?");
  log().error({ reference, err: error, url: address, kind: context.routeType }, "fault");
};
