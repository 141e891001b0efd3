import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { createOffline } from "../../src/offline/registration.ts";
import { FakeContainer, FakeWorker, openPage } from "./browser.ts";

const answering = (complete: boolean, held = false) =>
  new FakeWorker("activated", {
    completeness: { complete, version: "0badcafe", held },
    "show-open": false,
  });

let container: FakeContainer;
const reload = vi.fn();

beforeEach(() => {
  container = new FakeContainer();
  openPage(container);
  reload.mockReset();
});
afterEach(() => vi.unstubAllGlobals());

/** A window that an active worker serves. */
async function startServed(worker = answering(true)) {
  container.registration.active = worker;
  container.controller = worker;
  const offline = createOffline({ reload });
  offline.start();
  await vi.waitFor(() => expect(container.register).toHaveBeenCalled());
  await vi.waitFor(() => expect(offline.state().version).not.toBeNull());
  return offline;
}

function startFirstVisit() {
  const offline = createOffline({ reload });
  offline.start();
  return offline;
}

describe("readiness", () => {
  it("is unsupported where there are no service workers", () => {
    openPage(null);
    expect(startFirstVisit().state().readiness).toBe("unsupported");
  });

  it("is unsupported where the browser forbids them", async () => {
    container.register.mockRejectedValue(new DOMException("no", "SecurityError"));
    const offline = startFirstVisit();
    await vi.waitFor(() => expect(offline.state().readiness).toBe("unsupported"));
  });

  it("has failed when the worker can't be fetched", async () => {
    container.register.mockRejectedValue(new TypeError("no network"));
    const offline = startFirstVisit();
    await vi.waitFor(() => expect(offline.state().readiness).toBe("failed"));
  });

  it("is what the serving worker says, even if the registration fails", async () => {
    container.register.mockRejectedValue(new TypeError("no network"));
    const offline = await startServed();
    expect(offline.state()).toEqual({ readiness: "ready", update: "none", version: "0badcafe" });
  });

  it("has failed when the worker misses a file", async () => {
    const offline = await startServed(answering(false));
    expect(offline.state().readiness).toBe("failed");
  });

  it("is being prepared until the first worker is active and has answered", async () => {
    const worker = answering(true);
    worker.state = "installing";
    container.registration.find(worker);
    const offline = startFirstVisit();
    await vi.waitFor(() => expect(container.register).toHaveBeenCalled());
    await Promise.resolve();
    expect(worker.messages).toEqual([]);
    expect(offline.state().readiness).toBe("preparing");
    container.registration.activate();
    container.control(worker);
    await vi.waitFor(() => expect(offline.state().readiness).toBe("ready"));
    expect(offline.state().update).toBe("none");
  });

  it("has failed when the first installation fails", async () => {
    container.registration.find(new FakeWorker("installing"));
    const offline = startFirstVisit();
    await vi.waitFor(() => expect(container.register).toHaveBeenCalled());
    container.registration.settle("redundant");
    await vi.waitFor(() => expect(offline.state().readiness).toBe("failed"));
  });

  it("is told to whoever listens", async () => {
    const offline = createOffline({ reload });
    const seen: string[] = [];
    offline.onChange(() => seen.push(offline.state().readiness));
    container.registration.active = answering(true);
    offline.start();
    await vi.waitFor(() => expect(seen.at(-1)).toBe("ready"));
  });
});

describe("the registration", () => {
  it("keeps the browser's own store away from the worker", async () => {
    await startServed();
    expect(container.register).toHaveBeenCalledWith("./sw.js", { updateViaCache: "none" });
  });

  it("hands over a trusted address where the browser asks for one, and of nothing else", async () => {
    const createPolicy = vi.fn((name: string, rules: { createScriptURL(a: string): string }) => ({
      createScriptURL: (address: string) => `${name} ${rules.createScriptURL(address)}`,
    }));
    vi.stubGlobal("trustedTypes", { createPolicy });
    await startServed();
    expect(container.register.mock.calls[0]?.[0]).toBe("fadewright-worker ./sw.js");
    const rules = createPolicy.mock.calls[0]?.[1];
    expect(() => rules?.createScriptURL("./other.js")).toThrow("./other.js");
  });
});

describe("an update", () => {
  it("that waits from the start is offered", async () => {
    container.registration.waiting = new FakeWorker("installed");
    const offline = await startServed();
    await vi.waitFor(() => expect(offline.state().update).toBe("waiting"));
  });

  it("that is installed later is offered once it waits", async () => {
    const offline = await startServed();
    container.registration.find(new FakeWorker("installing"));
    expect(offline.state().update).toBe("none");
    container.registration.settle("installed");
    await vi.waitFor(() => expect(offline.state().update).toBe("waiting"));
  });

  it("that the worker keeps back for an open show is offered, and let go on request", async () => {
    const worker = answering(true, true);
    const offline = await startServed(worker);
    expect(offline.state().update).toBe("waiting");
    offline.takeUpdate();
    await vi.waitFor(() => expect(reload).toHaveBeenCalledTimes(1));
    expect(worker.messages.at(-1)).toEqual({ type: "release" });
  });

  it("loads the window once, however often it is asked for, and not before it serves", async () => {
    const waiting = new FakeWorker("installed");
    container.registration.waiting = waiting;
    const offline = await startServed();
    offline.takeUpdate();
    offline.takeUpdate();
    expect(waiting.messages).toEqual([{ type: "take-over" }, { type: "take-over" }]);
    waiting.become("activating");
    container.control(waiting);
    await Promise.resolve();
    expect(reload).not.toHaveBeenCalled();
    container.registration.activate();
    await vi.waitFor(() => expect(reload).toHaveBeenCalled());
    expect(reload).toHaveBeenCalledTimes(1);
    expect(offline.state().update).toBe("waiting");
  });

  it("that is overtaken by a newer one can be asked for again", async () => {
    const [older, newer] = [new FakeWorker("installed"), new FakeWorker("installed")];
    container.registration.waiting = older;
    const offline = await startServed();
    offline.takeUpdate();
    container.registration.waiting = newer;
    older.become("redundant");
    await vi.waitFor(() => expect(offline.state().update).toBe("waiting"));
    expect(reload).not.toHaveBeenCalled();
    offline.takeUpdate();
    container.registration.activate();
    await vi.waitFor(() => expect(reload).toHaveBeenCalledTimes(1));
  });

  it("taken by another window is told of and loads nothing until asked", async () => {
    const offline = await startServed();
    container.control(new FakeWorker("activated"));
    expect(offline.state().update).toBe("taken-elsewhere");
    expect(reload).not.toHaveBeenCalled();
    offline.takeUpdate();
    expect(reload).toHaveBeenCalledTimes(1);
  });

  it("is not taken without there being one", async () => {
    const offline = await startServed();
    offline.takeUpdate();
    expect(reload).not.toHaveBeenCalled();
  });
});

describe("a look for an update", () => {
  it("says that there is none", async () => {
    const offline = await startServed();
    expect(await offline.checkForUpdate()).toBe("none");
    expect(container.registration.update).toHaveBeenCalledTimes(1);
  });

  it("is never made by itself", async () => {
    await startServed();
    expect(container.registration.update).not.toHaveBeenCalled();
  });

  it("waits for the installation that it has set off", async () => {
    const offline = await startServed();
    container.registration.update.mockImplementation(async () => {
      container.registration.find(new FakeWorker("installing"));
    });
    const outcome = offline.checkForUpdate();
    await vi.waitFor(() => expect(container.registration.installing).not.toBeNull());
    container.registration.settle("installed");
    expect(await outcome).toBe("found");
  });

  it.each([
    [true, "refused-by-lock"],
    [false, "unreachable"],
    [null, "unreachable"],
  ])("asks the worker why an installation failed (show open: %s)", async (isOpen, expected) => {
    const worker = new FakeWorker("activated", {
      completeness: { complete: true, version: "0badcafe", held: false },
      "show-open": isOpen,
    });
    const offline = await startServed(worker);
    container.registration.update.mockImplementation(async () => {
      container.registration.find(new FakeWorker("installing"));
    });
    const outcome = offline.checkForUpdate();
    await vi.waitFor(() => expect(container.registration.installing).not.toBeNull());
    container.registration.settle("redundant");
    expect(await outcome).toBe(expected);
    expect(offline.state().update).toBe("none");
  });

  it("says that the host can't be reached", async () => {
    const offline = await startServed();
    container.registration.update.mockRejectedValue(new TypeError("no network"));
    expect(await offline.checkForUpdate()).toBe("unreachable");
  });

  it("remembers without network what waits already", async () => {
    container.registration.waiting = new FakeWorker("installed");
    const offline = await startServed();
    container.registration.update.mockRejectedValue(new TypeError("no network"));
    expect(await offline.checkForUpdate()).toBe("found");
  });

  it("finds nothing to ask before the worker is registered", async () => {
    expect(await createOffline({ reload }).checkForUpdate()).toBe("unreachable");
  });
});
