import { expect, test } from "@/tests/setup/browser";

test("the server tells how it is, and comes back with its data after a power cut", async ({
  bookmatch,
  request,
}) => {
  const healthy = await request.get("/api/health");
  expect(healthy.status()).toBe(200);
  await bookmatch.kill();
  await bookmatch.start();
  expect((await request.get("/api/health")).status()).toBe(200);
});
