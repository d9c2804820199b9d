import { handle } from "@/app/_server/handle";
import { no } from "@/lib/result";

/** Whatever no other route answers: a client that asks for JSON never gets a page. */
const nothingHere = handle({ actor: "nobody" }, async () =>
  no("notFound", "There is nothing at this address. GET /api/v1/openapi.json lists what there is."),
);

export {
  nothingHere as DELETE,
  nothingHere as GET,
  nothingHere as PATCH,
  nothingHere as POST,
  nothingHere as PUT,
};
