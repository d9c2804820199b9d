import "server-only";

/** Answers with a CSV file of a name that the browser saves it under. */
export function csvResponse(name: string, text: string): Response {
  return new Response(text, {
    headers: {
      "content-type": "text/csv; charset=utf-8",
      "content-disposition": `attachment; filename="${name}.csv"`,
      "cache-control": "no-store",
    },
  });
}
