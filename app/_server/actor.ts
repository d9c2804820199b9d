import "server-only";
import { keyOf } from "@/app/_server/key-actor";
import { kioskOf, workerOf } from "@/app/_server/kiosk-actor";
import { personOf } from "@/app/_server/person";
import { type Action, type Held, type Reach, reachOf } from "@/lib/access/may";
import { no, ok, type Result } from "@/lib/result";

/** A tablet, known by its device cookie. A revoked one may still hand in what it kept. */
export interface KioskActor {
  kind: "kiosk";
  siteId: string;
  kioskId: string;
  revokedAt: Date | null;
}

/** A worker's open session on a kiosk: the device cookie and the worker's Bearer token together. */
export interface WorkerActor {
  kind: "worker";
  siteId: string;
  kioskId: string;
  sessionId: string;
  workerId: string;
  number: string;
  held: readonly Held[];
}

/** Someone signed in to the office. */
export interface PersonActor {
  kind: "person";
  siteId: string;
  accountId: string;
  sessionId: string;
  name: string;
  email: string;
  /** The worker that this person is, if any: own hours. */
  workerId: string | null;
  held: readonly Held[];
}

/** An integration key. */
export interface KeyActor {
  kind: "key";
  siteId: string;
  keyId: string;
  held: readonly Held[];
}

interface Actors {
  nobody: { kind: "nobody" };
  kiosk: KioskActor;
  worker: WorkerActor;
  person: PersonActor;
  key: KeyActor;
}

export type ActorKind = keyof Actors;
export type Actor<K extends ActorKind = ActorKind> = Actors[K];

/**
 * Finds who is calling and how far they may go. An entrance for people or keys without an action is
 * our mistake and refuses everybody.
 */
export async function findActor<K extends ActorKind>(
  kind: K,
  request: Request,
  action: Action | undefined,
): Promise<Result<{ actor: Actor<K>; reach: Reach | null }>> {
  const found = await finders[kind](request);
  if (!found.ok) return found;
  // safe because `finders` gives the actor of the kind that it was asked for
  const actor = found.value as Actor<K>;
  if (!("held" in actor) || actor.kind === "worker") return ok({ actor, reach: null });
  const reach = action ? reachOf(actor.held, action) : null;
  if (!reach) return no("forbidden", "Your role does not open this. Ask an admin if it should.");
  return ok({ actor, reach });
}

const finders: { [K in ActorKind]: (request: Request) => Promise<Result<Actor<K>>> } = {
  nobody: async () => ok({ kind: "nobody" }),
  kiosk: kioskOf,
  worker: workerOf,
  person: personOf,
  key: keyOf,
};
