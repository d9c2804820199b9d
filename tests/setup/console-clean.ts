import { afterEach, beforeEach, expect, vi } from "vitest";

/** Fails a test that prints a warning or an error it did not expect: noise hides faults. */
beforeEach(() => {
  vi.spyOn(console, "error");
  vi.spyOn(console, "warn");
});

afterEach(() => {
  expect(vi.mocked(console.error).mock.calls, "console.error was called").toEqual([]);
  expect(vi.mocked(console.warn).mock.calls, "console.warn was called").toEqual([]);
  vi.restoreAllMocks();
});
