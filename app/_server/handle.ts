import "server-only";
import { randomUUID } from "node:crypto";
import type { z } from "zod";
import { type Actor, type ActorKind, findActor } from "@/app/_server/actor";
import { log } from "@/app/_server/log";
import { faultResponse, problemResponse } from "@/app/_server/problem";
import { check, readJson } from "@/app/_server/read-body";
import type { Action, Reach } from "@/lib/access/may";
import { ok, type Result } from "@/lib/result";

/** Who may call an entrance, what it takes. An office or integration entrance names its action. */
export interface Entrance<K extends ActorKind, B, Q> {
  actor: K;
  may?: Action;
  body?: z.ZodType<B>;
  query?: z.ZodType<Q>;
}

export interface Call<K extends ActorKind, B, Q> {
  actor: Actor<K>;
  /** How far the action reaches for this actor; null where the entrance names none. */
  reach: Reach | null;
  body: B;
  query: Q;
  params: Record<string, string>;
  request: Request;
  receivedAt: Date;
}

interface Context {
  /** Next gives nothing where the path has no parameters. */
  params: Promise<Record<string, string | string[] | undefined> | undefined>;
}

/** What a handler answers: a value for JSON, a `Response` of its own, or a problem. */
type Answer = Result<unknown> | Response;

/**
 * Wraps a route handler: actor, then query and body, then `run`, then the answer. The only place
 * that parses requests, maps problems to statuses, and catches what nobody expected.
 */
export function handle<K extends ActorKind, B = undefined, Q = undefined>(
  entrance: Entrance<K, B, Q>,
  run: (call: Call<K, B, Q>) => Promise<Answer>,
) {
  const handler = async (request: Request, context: Context): Promise<Response> => {
    const receivedAt = new Date();
    try {
      const answer = await answerCall(entrance, run, { request, context, receivedAt });
      if (answer instanceof Response) return answer;
      if (!answer.ok) return problemResponse(answer.problem);
      return Response.json(answer.value, { headers: { "cache-control": "no-store" } });
    } catch (error) {
      const reference = randomUUID().slice(0, 8);
      log().error({ reference, err: error, url: new URL(request.url).pathname }, "fault");
      return faultResponse(reference);
    }
  };
  return Object.assign(handler, { entrance });
}

async function answerCall<K extends ActorKind, B, Q>(
  entrance: Entrance<K, B, Q>,
  run: (call: Call<K, B, Q>) => Promise<Answer>,
  { request, context, receivedAt }: { request: Request; context: Context; receivedAt: Date },
): Promise<Answer> {
  const found = await findActor(entrance.actor, request, entrance.may);
  if (!found.ok) return found;
  const { actor, reach } = found.value;
  const queryText = Object.fromEntries(new URL(request.url).searchParams);
  // safe because an entrance without a schema has `undefined` as its type
  const query = entrance.query ? check(queryText, entrance.query) : ok(undefined as Q);
  if (!query.ok) return query;
  const body = entrance.body ? await readJson(request, entrance.body) : ok(undefined as B);
  if (!body.ok) return body;
  const params = Object.fromEntries(
    Object.entries((await context.params) ?? {}).map(([name, value]) => [
      name,
      String(value ?? ""),
    ]),
  );
  return run({ actor, reach, body: body.value, query: query.value, params, request, receivedAt });
}
