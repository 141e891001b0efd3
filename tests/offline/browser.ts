import { vi } from "vitest";

/** As much of a browser's service workers as the page side looks at, moved by the tests. */
export class FakeWorker extends EventTarget {
  readonly scriptURL = "https://app.test/sw.js";
  readonly messages: unknown[] = [];
  state: ServiceWorkerState;
  /** What it answers to a message of some type. */
  readonly answers: Readonly<Record<string, unknown>>;

  constructor(state: ServiceWorkerState, answers: Readonly<Record<string, unknown>> = {}) {
    super();
    this.state = state;
    this.answers = answers;
  }

  postMessage(message: { type: string }, [port]: readonly MessagePort[] = []): void {
    this.messages.push(message);
    port?.postMessage(this.answers[message.type]);
    port?.close();
  }

  become(state: ServiceWorkerState): void {
    this.state = state;
    this.dispatchEvent(new Event("statechange"));
  }
}

export class FakeRegistration extends EventTarget {
  installing: FakeWorker | null = null;
  waiting: FakeWorker | null = null;
  active: FakeWorker | null = null;
  update = vi.fn(async (): Promise<void> => {});

  /** A worker begins to be installed. */
  find(worker: FakeWorker): void {
    this.installing = worker;
    this.dispatchEvent(new Event("updatefound"));
  }

  /** The installation ends, with the worker waiting or dropped. */
  settle(state: "installed" | "redundant"): void {
    const worker = this.installing;
    this.installing = null;
    if (state === "installed") this.waiting = worker;
    worker?.become(state);
  }

  /** The waiting worker, or the one that is being installed, becomes the active one. */
  activate(): void {
    const worker = this.waiting ?? this.installing;
    this.waiting = null;
    this.installing = null;
    this.active = worker;
    worker?.become("activating");
    worker?.become("activated");
  }
}

export class FakeContainer extends EventTarget {
  controller: FakeWorker | null = null;
  readonly registration = new FakeRegistration();
  register = vi.fn(
    async (_address: unknown, _options: unknown): Promise<FakeRegistration> => this.registration,
  );

  control(worker: FakeWorker): void {
    this.controller = worker;
    this.dispatchEvent(new Event("controllerchange"));
  }
}

/** Puts a loaded page into place, with these service workers or with none. */
export function openPage(container: FakeContainer | null): void {
  vi.stubGlobal("navigator", container === null ? {} : { serviceWorker: container });
  vi.stubGlobal("self", globalThis);
  vi.stubGlobal("document", { readyState: "complete" });
  vi.stubGlobal("location", { href: "https://app.test/" });
}
