import { describe, expect, test } from "vitest";
import { openApi } from "@/lib/api/openapi";
import { apiRoutes } from "@/lib/api/routes";

interface Operation {
  operationId: string;
  description?: string;
  parameters: { name: string; in: string; required: boolean; schema: object }[];
  requestBody?: { content: Record<string, { schema: Record<string, unknown> }> };
  responses: Record<string, { content?: Record<string, { schema: { $ref: string } }> }>;
}

// safe because the tests below fail where the document is of another shape
const document = openApi() as {
  openapi: string;
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, { properties?: Record<string, unknown> }> };
};
const operations = Object.values(document.paths).flatMap((path) => Object.values(path));

/** Every `$ref` anywhere in a value. */
function refsIn(value: unknown): string[] {
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    key === "$ref" && typeof inner === "string" ? [inner] : refsIn(inner),
  );
}

describe("openApi", () => {
  test("describes every route once, each with a name of its own", () => {
    expect(document.openapi).toBe("3.1.0");
    const names = operations.map(({ operationId }) => operationId);
    expect(names.toSorted()).toEqual(apiRoutes.map(({ name }) => name).toSorted());
    expect(new Set(names).size).toBe(names.length);
  });
  test("is JSON whose references all lead somewhere", () => {
    expect(JSON.parse(JSON.stringify(document))).toEqual(document);
    const refs = new Set(refsIn(document));
    expect(refs.size).toBeGreaterThan(5);
    for (const ref of refs) {
      expect(document.components.schemas).toHaveProperty([
        ref.replace("#/components/schemas/", ""),
      ]);
    }
    expect(JSON.stringify(document)).not.toContain("$defs");
  });
  test("says of a list what it takes and who may ask", () => {
    const list = document.paths["/api/v1/tickets"]!.get!;
    expect(list.parameters.map(({ name }) => name)).toEqual([
      "status",
      "cell",
      "model",
      "cursor",
      "limit",
    ]);
    expect(list.parameters.every(({ required }) => !required)).toBe(true);
    expect(list.description).toBe("Keys that may: planner, lead.");
    expect(Object.keys(list.responses)).toEqual(["200", "401", "403", "422", "500"]);
  });
  test("says of a calculator what its body must be", () => {
    const split = document.paths["/api/v1/calculate/split"]!.post!;
    const body = split.requestBody!.content["application/json"]!.schema;
    expect(body).toMatchObject({ required: ["seconds", "weights"], additionalProperties: false });
    expect(Object.keys(split.responses)).toEqual(["200", "400", "401", "403", "413", "422", "500"]);
  });
  test("shows the kinds of events that a batch may hold", () => {
    const body = document.paths["/api/kiosk/events"]!.post!.requestBody!;
    const schema = JSON.stringify(body.content["application/json"]!.schema);
    expect(schema).toContain('"shift-start"');
    expect(schema).toContain('"hand-over"');
  });
  test("names what varies in a path", () => {
    expect(document.paths["/api/v1/tickets/{code}"]!.get!.parameters).toEqual([
      { name: "code", in: "path", required: true, schema: { type: "string" } },
    ]);
  });
  test("answers 304 empty, and 503 of the health check in its usual form", () => {
    expect(document.paths["/api/kiosk/cell"]!.get!.responses[304]).not.toHaveProperty("content");
    const unable = document.paths["/api/health"]!.get!.responses[503]!;
    expect(unable.content).toHaveProperty(["application/json"]);
  });
  test("a client must live with fields that come later", () => {
    expect(document.components.schemas.TicketPage).not.toHaveProperty("additionalProperties");
  });
});
