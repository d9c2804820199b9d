import { z } from "zod";
import { type Action, permissions } from "@/lib/access/may";
import { type ApiRoute, apiRoutes } from "@/lib/api/routes";
import { answers } from "@/lib/api/schema";
import { clockEvent, eventBatch } from "@/lib/ledger/schema";

type Json = Record<string, unknown>;

/**
 * Describes every route of the contract as OpenAPI 3.1, made from the schemas that validate and the
 * table of permissions that guards, so that it cannot say anything else than the code does.
 */
export function openApi(): Json {
  const paths: Record<string, Json> = {};
  for (const route of apiRoutes) {
    paths[route.path] = { ...paths[route.path], [route.method]: operationOf(route) };
  }
  return {
    openapi: "3.1.0",
    jsonSchemaDialect: "https://json-schema.org/draft/2020-12/schema",
    info: {
      title: "Bookmatch",
      version: "1",
      description:
        "Labour hours against standard. Instants are RFC 3339 with an offset, dates are the site's, " +
        "lengths are whole seconds. Refusals are application/problem+json (RFC 9457).",
    },
    servers: [{ url: "/" }],
    paths,
    components: { schemas: answerSchemas(), securitySchemes },
  };
}

const securitySchemes = {
  key: { type: "http", scheme: "bearer", description: "An integration key: bm_…" },
  device: { type: "apiKey", in: "cookie", name: "bookmatch_kiosk" },
  workerToken: { type: "http", scheme: "bearer", description: "From the kiosk's sign-in." },
};

const security = {
  nobody: [],
  key: [{ key: [] }],
  kiosk: [{ device: [] }],
  worker: [{ device: [], workerToken: [] }],
} as const satisfies Record<ApiRoute["actor"], readonly Record<string, readonly string[]>[]>;

function operationOf(route: ApiRoute): Json {
  return {
    operationId: route.name,
    summary: route.summary,
    ...(route.may ? { description: `Keys that may: ${rolesOf(route.may).join(", ")}.` } : {}),
    tags: [route.path.split("/")[2] === "kiosk" ? "kiosk" : "integration"],
    security: security[route.actor],
    parameters: [...pathParameters(route.path), ...queryParameters(route.query)],
    ...(route.body ? { requestBody: requestBody(route.body) } : {}),
    responses: responsesOf(route),
  };
}

function rolesOf(action: Action): string[] {
  return Object.keys(permissions[action]);
}

function pathParameters(path: string): Json[] {
  return [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: "path",
    required: true,
    schema: { type: "string" },
  }));
}

function queryParameters(query: z.ZodObject | undefined): Json[] {
  if (!query) return [];
  const { properties = {}, required = [] } = z.toJSONSchema(query, { io: "input" });
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: "query",
    required: required.includes(name),
    schema,
  }));
}

/** A batch reads its events one by one; the contract shows what each of them should be. */
const told = new Map<z.ZodType, z.ZodType>([
  [eventBatch, eventBatch.extend({ events: z.array(clockEvent).min(1) })],
]);

function requestBody(body: z.ZodType): Json {
  const { $schema: _, ...schema } = z.toJSONSchema(told.get(body) ?? body, { io: "input" });
  return { required: true, content: { "application/json": { schema } } };
}

/** The answers as components. A client must live with fields that come later: none is the last. */
function answerSchemas(): Json {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(answers)) registry.add(schema, { id });
  const { schemas } = z.toJSONSchema(registry, {
    uri: (id) => `#/components/schemas/${id}`,
    override: ({ jsonSchema }) => {
      if (jsonSchema.additionalProperties === false) delete jsonSchema.additionalProperties;
    },
  });
  return Object.fromEntries(
    Object.entries(schemas).map(([id, { $schema: _, $id: __, ...schema }]) => [id, schema]),
  );
}

function responsesOf(route: ApiRoute): Json {
  const refusals: Record<number, string> = {
    ...(route.actor === "nobody"
      ? {}
      : { 401: "Who is calling is not known.", 403: "Not yours to do, or taken out of use." }),
    ...(route.body ? { 400: "Not JSON.", 413: "Over 1 MB." } : {}),
    ...(route.body || route.query || route.path.includes("{")
      ? { 422: "Something cannot be taken; `errors` names it by path." }
      : {}),
    500: "Our own fault; the reference helps to find it.",
    ...route.also,
  };
  const responses: Json = { 200: answered("Done.", "application/json", route.answer) };
  for (const [status, text] of Object.entries(refusals)) {
    responses[status] = answered(text, "application/problem+json", "Problem");
  }
  if (route.unchanged) responses[304] = { description: "As the `ETag` that was sent." };
  if (route.unable) responses[503] = answered(route.unable, "application/json", route.answer);
  return responses;
}

function answered(description: string, type: string, name: keyof typeof answers): Json {
  const schema = { $ref: `#/components/schemas/${name}` };
  return { description, content: { [type]: { schema } } };
}
