/** A route handler as Next calls it. */
export type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string | string[] | undefined>> },
) => Promise<Response>;

export interface Asked {
  /** With its query, such as `/api/v1/tickets?limit=2`. */
  path: string;
  params?: Record<string, string>;
  /** An integration key or a worker's token. */
  bearer?: string;
  cookie?: string;
  /** Any others, by their names in small letters. */
  headers?: Record<string, string>;
  /** Sent as JSON, or as it is where it is text. */
  body?: unknown;
}

/** Calls a route handler as a request would, and reads its JSON answer. */
export async function call(handler: Handler, asked: Asked) {
  const { path, params = {}, bearer, cookie, headers = {}, body } = asked;
  const request = new Request(`http://localhost${path}`, {
    method: body === undefined ? "GET" : "POST",
    headers: {
      ...(bearer ? { authorization: `Bearer ${bearer}` } : {}),
      ...(cookie ? { cookie } : {}),
      ...headers,
    },
    ...(body === undefined ? {} : { body: typeof body === "string" ? body : JSON.stringify(body) }),
  });
  const response = await handler(request, { params: Promise.resolve(params) });
  const text = await response.text();
  return {
    status: response.status,
    type: response.headers.get("content-type"),
    headers: response.headers,
    // safe because a test reads what it expects and fails on anything else
    json: (text ? JSON.parse(text) : null) as Record<string, never>,
  };
}
