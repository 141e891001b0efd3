import { afterEach, expect, vi } from "vitest";

// A test that makes the program print has found something: the console must stay silent.
const spies = (["log", "warn", "error"] as const).map((level) => vi.spyOn(console, level));

afterEach(() => {
  const printed = spies.flatMap((spy) => spy.mock.calls);
  for (const spy of spies) spy.mockClear();
  expect(printed).toEqual([]);
});
