import "fake-indexeddb/auto";
import { beforeEach, describe, expect, test } from "vitest";
import { type Outbox, openOutbox } from "@/kiosk/outbox";
import { openStore, type Store } from "@/kiosk/store";
import { draft, uuidOf } from "./records";

let store: Store;
let outbox: Outbox;
let files = 0;

beforeEach(async () => {
  files += 1;
  store = await openStore(() => undefined, `outbox-${files}`);
  outbox = openOutbox(store);
});

const ids = (events: readonly { id: string }[]) => events.map(({ id }) => id);
const booked = (id: string) => ({ id, verdict: "booked" as const, looseEnds: [] });

describe("openOutbox", () => {
  test("keeps records in the order of the taps and numbers them", async () => {
    await outbox.add([draft(1), draft(2)]);
    await outbox.add([draft(3)]);
    const events = await outbox.oldest(10);
    expect(ids(events)).toEqual([uuidOf(1), uuidOf(2), uuidOf(3)]);
    expect(events.map(({ clock }) => clock.seq)).toEqual([1, 2, 3]);
  });

  test("keeps a record that is added twice once, as it was first", async () => {
    const [first] = await outbox.add([draft(1)]);
    const [second] = await outbox.add([draft(1, { note: "changed" })]);
    expect(second).toEqual(first);
    expect(await outbox.count()).toBe(1);
  });

  test("keeps several records of one act all or none", async () => {
    const broken = draft(2);
    Object.assign(broken, { note: () => "a function cannot be stored" });
    await expect(outbox.add([draft(1), broken])).rejects.toThrow(/could not be cloned/);
    expect(await outbox.count()).toBe(0);
  });

  test("numbers go on after the page was loaded again", async () => {
    await outbox.add([draft(1)]);
    store.close();
    store = await openStore(() => undefined, `outbox-${files}`);
    const [second] = await openOutbox(store).add([draft(2)]);
    expect(second?.clock.seq).toBe(2);
  });

  test("lets go of a record on its own verdict only", async () => {
    const events = await outbox.add([draft(1), draft(2), draft(3)]);
    await outbox.settle([{ event: events[1]!, result: booked(uuidOf(2)) }]);
    expect(ids(await outbox.oldest(10))).toEqual([uuidOf(1), uuidOf(3)]);
  });

  test("counts what is set aside, leaves it out of the row, and takes it back", async () => {
    await outbox.add([draft(1), draft(2)]);
    await outbox.setAside(uuidOf(1), 5);
    expect(ids(await outbox.oldest(10))).toEqual([uuidOf(2)]);
    expect(ids(await outbox.oldest(10, true))).toEqual([uuidOf(1), uuidOf(2)]);
    expect(await outbox.count()).toBe(2);
    await outbox.takeBack();
    expect(ids(await outbox.oldest(10))).toEqual([uuidOf(1), uuidOf(2)]);
  });
});
