import "server-only";
import { headers } from "next/headers";

/** The address under which the caller reached us, `https://bookmatch.example`; proxies are heard. */
export async function ownAddress(): Promise<string> {
  const asked = await headers();
  const host = asked.get("x-forwarded-host") ?? asked.get("host") ?? "localhost";
  return `${asked.get("x-forwarded-proto") ?? "http"}://${host}`;
}
