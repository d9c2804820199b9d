import { once } from "node:events";
import { createServer } from "node:net";
import { describe, expect, test } from "vitest";
import { freePortFrom, isFree, portOf } from "@/scripts/ground/ports.mjs";

describe("portOf", () => {
  test("is the same for a folder every time, below the ports that the system hands out", () => {
    for (const folder of ["/srv/a", "/srv/b", "/home/ana/bookmatch/.data"]) {
      expect(portOf(folder)).toBe(portOf(folder));
      expect(portOf(folder)).toBeGreaterThanOrEqual(20_000);
      expect(portOf(folder)).toBeLessThan(30_000);
    }
    expect(portOf("/srv/a")).not.toBe(portOf("/srv/b"));
  });
});

describe("freePortFrom", () => {
  test("passes over a port that somebody listens on", async () => {
    const port = await freePortFrom(29_990);
    const taken = createServer().listen(port, "127.0.0.1");
    await once(taken, "listening");
    expect(await isFree(port)).toBe(false);
    expect(await freePortFrom(port)).not.toBe(port);
    taken.close();
  });
});
